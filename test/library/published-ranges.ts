/**
 * Published permeabilities of single films, transcribed in the units of their sources.
 *
 * biosystems     Biosystems Engineering, chapter 11 "Food Package Engineering", Table 11.2, p. 345: ranges; oxygen at
 *                25 °C, humidity not stated unless said; water at 38 °C, 90 % (other side taken as dry).
 * rollprint      Rollprint, "Barrier properties of flexible packaging materials": typical values of 1 mil films, test
 *                conditions not stated; held against the test as it stands.
 * pp-properties  Property table of cast and biaxially oriented polypropylene film: water at 100 °F (E96), oxygen at
 *                77 °F (D1434).
 * jfst-2015      J. Food Sci. Technol. 52 (2015) 5456, Table 1: E96, 38 °C and 90 %, rate times gauge of each film.
 * auras-2004     J. Appl. Polym. Sci. 92 (2004) 1790, abstract: oxygen over 5 to 40 °C and a_w 0 to 0.9, so a wide range.
 * mgc            Mitsubishi Gas Chemical, Nylon-MXD6, Table 3: oxygen through 20 µm films at 23 °C; humidity as said.
 */
export type PublishedSource =
  'biosystems' | 'rollprint' | 'pp-properties' | 'jfst-2015' | 'auras-2004' | 'mgc';

/** What the product's tables are held to: rates through 25 µm. */
export const QUANTITIES = ['oxygen 0 %', 'oxygen 50 %', 'water'] as const;
export type Quantity = (typeof QUANTITIES)[number];

export interface PublishedRange {
  source: PublishedSource;
  quantities: readonly Quantity[];
  /** The same twice where the source gives one value. */
  low: number;
  high: number;
  /** A name of UNITS: a permeability, or a water rate times thickness. */
  unit: string;
  /** Absent: not stated, or stated over a span; then taken at the test's own temperature. */
  temperatureC?: number;
}

const OXYGEN: readonly Quantity[] = ['oxygen 0 %', 'oxygen 50 %'];
const WATER: readonly Quantity[] = ['water'];
const OXYGEN_MIL = 'cm3(STP)*mil/(100in2*day*atm)';
const OXYGEN_UM = 'cm3(STP)*um/(m2*day*atm)';
const OXYGEN_20_UM = 'cm3(STP)*20um/(m2*day*atm)';
const WATER_MIL = 'g*mil/(100in2*day)';
const WATER_UM = 'g*um/(m2*day)';

type Ends = readonly [low: number, high: number];

function biosystems({ oxygen, water }: { oxygen: Ends; water?: Ends }): PublishedRange[] {
  const range = ([low, high]: Ends) => ({ source: 'biosystems' as const, low, high });
  return [
    { ...range(oxygen), quantities: OXYGEN, unit: OXYGEN_MIL, temperatureC: 25 },
    ...(water ? [{ ...range(water), quantities: WATER, unit: WATER_MIL, temperatureC: 38 }] : []),
  ];
}

function rollprint({ oxygen, water }: { oxygen?: Ends; water?: Ends }): PublishedRange[] {
  const range = ([low, high]: Ends) => ({ source: 'rollprint' as const, low, high });
  return [
    ...(oxygen ? [{ ...range(oxygen), quantities: OXYGEN, unit: OXYGEN_MIL }] : []),
    ...(water ? [{ ...range(water), quantities: WATER, unit: WATER_MIL }] : []),
  ];
}

function ppProperties({ oxygen, water }: { oxygen: Ends; water: Ends }): PublishedRange[] {
  const source = 'pp-properties';
  return [
    { source, quantities: OXYGEN, low: oxygen[0], high: oxygen[1], unit: OXYGEN_MIL, temperatureC: 25 },
    { source, quantities: WATER, low: water[0], high: water[1], unit: WATER_MIL, temperatureC: 38 },
  ];
}

function jfst([low, high]: Ends): PublishedRange[] {
  return [{ source: 'jfst-2015', quantities: WATER, low, high, unit: WATER_UM, temperatureC: 38 }];
}

function auras([low, high]: Ends): PublishedRange[] {
  return [{ source: 'auras-2004', quantities: OXYGEN, low, high, unit: OXYGEN_UM }];
}

/** One value for 60, 80 and 90 %: humidity has no effect. */
function mgcAtAnyHumidity(value: number): PublishedRange[] {
  return [
    { source: 'mgc', quantities: OXYGEN, low: value, high: value, unit: OXYGEN_20_UM, temperatureC: 23 },
  ];
}

/** Where humidity raises the rate, the value at 60 % is the most it can be at 0 and 50 %. */
function mgcAtMost(valueAt60: number): PublishedRange[] {
  return [
    { source: 'mgc', quantities: OXYGEN, low: 0, high: valueAt60, unit: OXYGEN_20_UM, temperatureC: 23 },
  ];
}

const LDPE = biosystems({ oxygen: [300, 600], water: [1, 2] });
const HDPE = biosystems({ oxygen: [100, 250], water: [0.3, 0.6] });
const PET = biosystems({ oxygen: [3, 6], water: [1, 2] });
const NYLON_6 = biosystems({ oxygen: [2, 3], water: [10, 20] });
/** 0.0007–0.1 is said of 0 % only; 0.2–3 of 100 %. In between the rate lies in between. */
const EVOH: PublishedRange[] = [
  {
    source: 'biosystems',
    quantities: ['oxygen 0 %'],
    low: 0.0007,
    high: 0.1,
    unit: OXYGEN_MIL,
    temperatureC: 25,
  },
  {
    source: 'biosystems',
    quantities: ['oxygen 50 %'],
    low: 0.0007,
    high: 3,
    unit: OXYGEN_MIL,
    temperatureC: 25,
  },
  ...rollprint({ oxygen: [0.006, 0.12], water: [1.4, 8] }),
];

/** Published ranges by the library's films. Where a source names no such film, its nearest relative stands in. */
export const publishedRanges: Readonly<Record<string, readonly PublishedRange[]>> = {
  ldpe: [...LDPE, ...rollprint({ water: [0.9, 0.9] }), ...jfst([467, 572])],
  // Linear, blended and grafted polyethylenes: held to the range of LDPE, the only low-density one in the tables.
  lldpe: LDPE,
  'pe-sealant-coex': LDPE,
  'tie-resin': LDPE,
  hdpe: [...HDPE, ...rollprint({ water: [0.37, 0.37] })],
  // Oriented and rich in HDPE: held to HDPE.
  'mdo-pe': HDPE,
  cpp: [
    ...biosystems({ oxygen: [150, 250], water: [0.6, 0.7] }),
    ...rollprint({ oxygen: [150, 180], water: [1, 1.3] }),
    ...ppProperties({ oxygen: [150, 240], water: [0.7, 0.7] }),
  ],
  bopp: [
    ...biosystems({ oxygen: [100, 160], water: [0.2, 0.5] }),
    ...rollprint({ oxygen: [150, 150], water: [0.33, 0.33] }),
    ...ppProperties({ oxygen: [160, 160], water: [0.25, 0.25] }),
    ...jfst([156, 221]),
    ...mgcAtAnyHumidity(2500),
  ],
  eva: biosystems({ oxygen: [460, 460], water: [11.5, 11.5] }),
  ionomer: biosystems({ oxygen: [300, 450], water: [1.5, 2] }),
  bopet: [
    ...PET,
    ...rollprint({ oxygen: [4.5, 4.5], water: [1.5, 1.5] }),
    ...auras([613, 3680]),
    ...mgcAtAnyHumidity(80),
  ],
  // biosystems says "PET" and no more; auras-2004 is about PET films in general.
  apet: [...PET, ...auras([613, 3680])],
  pc: biosystems({ oxygen: [180, 300], water: [10, 15] }),
  bopa6: [...NYLON_6, ...rollprint({ oxygen: [3, 3], water: [26.5, 26.5] }), ...mgcAtMost(40)],
  'pa6-cast': [...NYLON_6, ...rollprint({ oxygen: [3.5, 3.5], water: [19, 19] })],
  'mxd6-oriented': mgcAtMost(2.8),
  'mxd6-unoriented': mgcAtMost(4.3),
  'evoh-27': EVOH,
  'evoh-32': [...EVOH, ...mgcAtMost(0.5)],
  'evoh-38': EVOH,
  'evoh-44': [...EVOH, ...mgcAtMost(2)],
  'pvdc-film': [...biosystems({ oxygen: [0.1, 2], water: [0.02, 0.6] }), ...jfst([192, 192])],
  'pvc-rigid': [
    ...biosystems({ oxygen: [5, 15], water: [2, 5] }),
    ...rollprint({ oxygen: [11, 11], water: [2.3, 2.3] }),
    ...jfst([870, 1130]),
  ],
  'pvc-plasticised': biosystems({ oxygen: [50, 1500], water: [15, 40] }),
  ps: biosystems({ oxygen: [250, 350], water: [7, 10] }),
  pla: auras([12_300, 73_600]),
};

const NO_COPOLYESTER = 'The tables name PET and polycarbonate, no glycol-modified copolyester.';
const NO_PHA = 'No polyhydroxyalkanoate in the tables.';
const NO_BARE_CELLULOSE = 'The tables hold coated cellulose film only; its base film is never measured bare.';
const NO_BARRIER = 'Open pores, no barrier: nobody publishes a permeability of plain paper.';
const NO_ADHESIVE = 'Laminating adhesives are in no table; the value is an order of magnitude.';
const NO_INK = 'Inks are in no table; the value is an order of magnitude.';
const NO_MXD6_WATER = 'The resin maker’s table is about oxygen; no other table names MXD6.';

const forAll = (reason: string): Record<Quantity, string> => ({
  'oxygen 0 %': reason,
  'oxygen 50 %': reason,
  water: reason,
});

/** Films, or one quantity of theirs, for which the tables hold no range, and why. */
export const withoutRange: Readonly<Record<string, Partial<Record<Quantity, string>>>> = {
  petg: forAll(NO_COPOLYESTER),
  'mxd6-oriented': { water: NO_MXD6_WATER },
  'mxd6-unoriented': { water: NO_MXD6_WATER },
  pla: {
    water: 'Read for oxygen only; the library’s water value comes from a data sheet outside these tables.',
  },
  phbv: forAll(NO_PHA),
  'cellulose-film': forAll(NO_BARE_CELLULOSE),
  paper: forAll(NO_BARRIER),
  'pu-adhesive': forAll(NO_ADHESIVE),
  ink: forAll(NO_INK),
};
