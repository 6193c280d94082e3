/**
 * Oxygen through 20 µm films at 23 °C and 60, 80 and 90 % relative humidity, cm³(STP)·20 µm/(m²·day·atm).
 * Source: Mitsubishi Gas Chemical, Nylon-MXD6, gas barrier properties, Table 3. Coated films are per film of 20 µm.
 */
export interface PublishedCurve {
  name: string;
  /** Its material of the library, where that holds a humidity curve. */
  libraryId?: string;
  at60: number;
  at80: number;
  at90: number;
}

export const publishedCurves: readonly PublishedCurve[] = [
  { name: 'EVOH 32 mol%', libraryId: 'evoh-32', at60: 0.5, at80: 4.5, at90: 50 },
  { name: 'EVOH 44 mol%', libraryId: 'evoh-44', at60: 2, at80: 8.5, at90: 42.5 },
  { name: 'BOPA 6', libraryId: 'bopa6', at60: 40, at80: 52, at90: 90 },
  { name: 'BOPA 6 + PVdC', at60: 10, at80: 10, at90: 10 },
  { name: 'MXD6, oriented', libraryId: 'mxd6-oriented', at60: 2.8, at80: 3.5, at90: 5.5 },
  { name: 'MXD6, unoriented', libraryId: 'mxd6-unoriented', at60: 4.3, at80: 7.5, at90: 20 },
  { name: 'BOPET', at60: 80, at80: 80, at90: 80 },
  { name: 'acrylonitrile copolymer', at60: 17, at80: 19, at90: 22 },
  { name: 'BOPP', at60: 2500, at80: 2500, at90: 2500 },
  { name: 'BOPP + PVdC', at60: 14, at80: 14, at90: 14 },
];
