import { wallInTest, type TransmissionTest } from '../../shared/engine';
import { fromSi, convert } from '../../shared/units';
import { libraryLayer } from './library-layers';

/**
 * Published rates of finished structures, each with the wall that stands for it in the library. Sources as the README's
 * table writes them:
 *
 * Phoenix    Phoenix Films, Technical bulletin C8: oxygen at 75 °F, 65 %, per atm; water at 100 °F (taken as 38 °C), 90 %;
 *            as made, after retort (120 °C, 20 min) and after 240 flexes (Gelbo). Its water figure of the SiOx laminate
 *            contradicts itself.
 * Rollprint  "Barrier properties of flexible packaging materials": typical values, tests and base gauges not stated.
 * MGC        Mitsubishi Gas Chemical, Nylon-MXD6, Table 3: 20 µm films at 23 °C.
 * Biosystems Biosystems Engineering, Table 11.2, p. 345: multilayers; oxygen at 25 °C, water at 38 °C, 90 %; gauges and
 *            normalisation not stated.
 * AlOx sheet supplier's sheet of a coated PET, 12.9 µm: 23 °C, 50 %; 38 °C, 90 %.
 * ptonline   trade article on coated cellulose film: 75 °F, 0 %; 100 °F, 90 %.
 * alfipa, protpack, ukugi   vendors' statements on metallised PET, foil laminates, an EVOH laminate.
 */
type Layers = readonly (readonly [libraryId: string, gaugeUm?: number])[];

/**
 * independent: no value of the wall's layers was worked out from this measurement. partly: it had a hand in a coating's
 * value (the same film at another humidity; or it showed that there is nothing to subtract). circular: a coating was worked out from this very measurement.
 */
type Basis = 'independent' | 'partly' | 'circular';

export interface PublishedStructure {
  name: string;
  source: string;
  gas: 'oxygen' | 'water';
  /** The test in the README's words. */
  rateName: string;
  /** cm³(STP)/(m²·day·atm) or g/(m²·day): both ends of what was measured; `low` 0 for an upper bound. */
  low: number;
  high: number;
  basis: Basis;
  /** Outside face first. */
  layers: Layers;
  test: TransmissionTest;
}

function oxygenTest(temperatureC: number, humidity: number): TransmissionTest {
  return {
    gas: 'oxygen',
    temperature_C: temperatureC,
    relative_humidity_outside: humidity,
    relative_humidity_inside: humidity,
    oxygen_mole_fraction_dry: 1,
  };
}

const WATER_TEST: TransmissionTest = {
  gas: 'water',
  temperature_C: 38,
  relative_humidity_high: 0.9,
  relative_humidity_low: 0,
};

const per100In2 = {
  oxygen: (rate: number) => convert(rate, 'cm3(STP)/(100in2*day*atm)', 'cm3(STP)/(m2*day*atm)'),
  water: (rate: number) => convert(rate, 'g/(100in2*day)', 'g/(m2*day)'),
};

interface Measured {
  /** One value, both ends of a range, or the bound below which it lies. */
  rate?: number;
  ends?: readonly [number, number];
  below?: number;
  basis?: Basis;
  conditions?: { temperatureC: number; humidity: number; words: string };
}

interface Subject {
  name: string;
  source: string;
  layers: Layers;
}

const NOT_STATED = { temperatureC: 23, humidity: 0.5, words: 'test not stated' };

function structure(
  gas: 'oxygen' | 'water',
  subject: Subject,
  { rate = 0, ends, below, basis = 'independent', conditions = NOT_STATED }: Measured,
): PublishedStructure {
  const [low, high] = ends ?? (below === undefined ? [rate, rate] : [0, below]);
  const words = gas === 'oxygen' ? `OTR, ${conditions.words}` : 'WVTR';
  const test = gas === 'oxygen' ? oxygenTest(conditions.temperatureC, conditions.humidity) : WATER_TEST;
  return { ...subject, gas, rateName: words, low, high, basis, test };
}

const PHOENIX = { temperatureC: 23.9, humidity: 0.65, words: '24 °C 65 %' };
const AT_23_DRY = { temperatureC: 23, humidity: 0, words: '23 °C 0 %' };
const at23 = (percent: number) => ({
  temperatureC: 23,
  humidity: percent / 100,
  words: `23 °C ${percent} %`,
});

const SIOX_LAMINATE: Layers = [['bopa6', 15], ['siox-on-bopet'], ['bopet', 12], ['cpp', 60]];
const PREMIUM_ALOX_LAMINATE: Layers = [['bopa6', 15], ['alox-on-bopet-premium'], ['bopet', 12], ['cpp', 60]];
const ALOX_LAMINATE: Layers = [['bopa6', 15], ['alox-on-bopet'], ['bopet', 12], ['cpp', 60]];

const siox = { name: 'ONY15/PET12-SiOx/CPP60, as made', source: 'Phoenix', layers: SIOX_LAMINATE };
const sioxRetorted = { ...siox, name: 'the same after retort' };
const sioxFlexed = { ...siox, name: 'the same after 240 flexes' };
const aloxFromPremium = {
  name: 'ONY15/PET12-AlOx/CPP60, from a premium AlOx film',
  source: 'Phoenix',
  layers: PREMIUM_ALOX_LAMINATE,
};
const alumina = (name: string, coating: string): Subject => ({
  name: `Al₂O₃-coated PET, all grades; the library’s ${name}`,
  source: 'Rollprint',
  layers: [[coating], ['bopet', 12]],
});
const premiumAlumina = alumina('premium', 'alox-on-bopet-premium');
const standardAlumina = alumina('standard', 'alox-on-bopet');
const metallisedPet: Subject = {
  name: 'metallised PET, 10 µm',
  source: 'alfipa',
  layers: [['met-on-bopet'], ['bopet', 10]],
};
const saranBopp: Subject = {
  name: 'PVdC-coated OPP (base 25 µm taken)',
  source: 'Rollprint',
  layers: [['pvdc-on-bopp'], ['bopp', 25]],
};
const saranNylon: Subject = {
  name: 'PVdC-coated nylon (base 15 µm taken)',
  source: 'Rollprint',
  layers: [['pvdc-on-bopa'], ['bopa6', 15]],
};
const saranNylon20: Subject = {
  name: 'PVdC-coated BOPA 20 µm',
  source: 'MGC',
  layers: [['pvdc-on-bopa'], ['bopa6', 20]],
};
const vinylAlcoholPet: Subject = {
  name: 'PVOH-coated PET (base 12 µm taken)',
  source: 'Rollprint',
  layers: [['pvoh-on-bopet'], ['bopet', 12]],
};
const foil9: Subject = { name: 'bare foil, 8.9 µm', source: 'Rollprint', layers: [['foil-9', 8.9]] };
const foil12: Subject = { name: 'bare foil, 12.7 µm', source: 'Rollprint', layers: [['foil-12', 12.7]] };
const foilLaminate: Subject = {
  name: 'foil laminate (PET12/foil 7/LDPE50 taken)',
  source: 'protpack',
  layers: [
    ['bopet', 12],
    ['foil-7', 7],
    ['ldpe', 50],
  ],
};

/** Structures whose prediction could have gone wrong, in the order of the README's table. */
export const predictable: readonly PublishedStructure[] = [
  structure('oxygen', siox, { rate: 0.4, conditions: PHOENIX }),
  structure('water', siox, { rate: 0.1 }),
  structure('oxygen', sioxRetorted, { rate: 6.4, conditions: PHOENIX }),
  structure('water', sioxRetorted, { rate: 3.2 }),
  structure('oxygen', sioxFlexed, { rate: 4.5, conditions: PHOENIX }),
  structure('water', sioxFlexed, { rate: 2.3 }),
  structure('oxygen', aloxFromPremium, { rate: 1.8, conditions: PHOENIX }),
  structure('water', aloxFromPremium, { rate: 1.4 }),
  structure('oxygen', premiumAlumina, { ends: [per100In2.oxygen(0.0008), per100In2.oxygen(0.05)] }),
  structure('water', premiumAlumina, { ends: [per100In2.water(0.0008), per100In2.water(0.03)] }),
  structure('oxygen', standardAlumina, { ends: [per100In2.oxygen(0.0008), per100In2.oxygen(0.05)] }),
  structure('water', standardAlumina, { ends: [per100In2.water(0.0008), per100In2.water(0.03)] }),
  structure('oxygen', metallisedPet, { below: 0.5 }),
  structure('water', metallisedPet, { below: 0.3 }),
  structure('oxygen', saranBopp, { rate: per100In2.oxygen(1.3) }),
  structure('oxygen', saranNylon, { rate: per100In2.oxygen(0.5) }),
  structure('oxygen', saranNylon20, { rate: 10, basis: 'partly', conditions: at23(80) }),
  structure('oxygen', saranNylon20, { rate: 10, basis: 'partly', conditions: at23(90) }),
  structure('water', vinylAlcoholPet, { rate: per100In2.water(4), basis: 'partly' }),
  structure('oxygen', foil9, { rate: per100In2.oxygen(0.001) }),
  structure('water', foil9, { rate: per100In2.water(0.002) }),
  structure('oxygen', foil12, { rate: per100In2.oxygen(0.001) }),
  structure('water', foil12, { rate: per100In2.water(0.001) }),
  structure('water', foilLaminate, { below: 0.03 }),
];

const circularOf = (subject: Subject) => ({
  oxygen: (rate: number, conditions = NOT_STATED) =>
    structure('oxygen', subject, { rate, conditions, basis: 'circular' }),
  water: (rate: number) => structure('water', subject, { rate, basis: 'circular' }),
});
const onBase = (name: string, layers: Layers, source = 'Rollprint') => circularOf({ name, source, layers });

const aloxLaminate = onBase('ONY15/PET12-AlOx/CPP60', ALOX_LAMINATE, 'Phoenix');
const saranPet = onBase('PVdC-coated PET', [['pvdc-on-bopet'], ['bopet', 12]]);
const saranOpp20: Layers = [['pvdc-on-bopp'], ['bopp', 20]];
const metPet = onBase('metallised PET', [['met-on-bopet'], ['bopet', 12]]);
const sioxPet = onBase('SiOx-coated PET, weakest grade', [['siox-on-bopet'], ['bopet', 12]]);
const aloxSheet = onBase('AlOx-coated PET', [['alox-on-bopet-premium'], ['bopet', 12]], 'AlOx sheet');
const coatedCellulose = onBase(
  'coated cellulose film',
  [['cellulose-barrier-coating'], ['cellulose-film', 23]],
  'ptonline',
);

/** Structures the library's coatings were worked out from: computing them gives them back, which proves nothing more. */
export const circular: readonly PublishedStructure[] = [
  aloxLaminate.oxygen(1.8, PHOENIX),
  aloxLaminate.water(1.4),
  saranPet.oxygen(per100In2.oxygen(0.5), AT_23_DRY),
  saranPet.water(per100In2.water(0.5)),
  onBase('PVdC-coated PP 20 µm', saranOpp20, 'MGC').oxygen(14, AT_23_DRY),
  onBase('PVdC-coated OPP', saranOpp20).water(per100In2.water(0.3)),
  circularOf(saranNylon20).oxygen(10, at23(60)),
  onBase('PVdC-coated nylon', saranNylon20.layers).water(per100In2.water(0.6)),
  circularOf(vinylAlcoholPet).oxygen(per100In2.oxygen(0.2), at23(50)),
  metPet.oxygen(per100In2.oxygen(0.1), AT_23_DRY),
  metPet.water(per100In2.water(0.05)),
  sioxPet.oxygen(per100In2.oxygen(0.04), AT_23_DRY),
  sioxPet.water(per100In2.water(0.04)),
  aloxSheet.oxygen(0.07, at23(50)),
  aloxSheet.water(0.18),
  coatedCellulose.oxygen(per100In2.oxygen(0.2), { ...PHOENIX, humidity: 0, words: '24 °C 0 %' }),
  coatedCellulose.water(per100In2.water(0.65)),
];

/**
 * Multilayers of Biosystems, in cm³·mil/(100 in²·day·atm) or g·mil/(100 in²·day) as the table's heading has it, whose
 * gauges it does not give: the gauges are ours, so they can show an order of magnitude and no more.
 */
export const multilayers: readonly (Omit<PublishedStructure, 'name' | 'source' | 'rateName' | 'basis'> & {
  name: string;
  gauges: string;
})[] = [
  multilayer('nylon 6–LDPE', { gas: 'oxygen', ends: [4, 5] }, [
    ['pa6-cast', 20],
    ['ldpe', 50],
  ]),
  multilayer('nylon 6–LDPE', { gas: 'water', ends: [0.5, 0.5] }, [
    ['pa6-cast', 20],
    ['ldpe', 50],
  ]),
  multilayer('EVOH–LDPE', { gas: 'oxygen', ends: [0.05, 0.1] }, [
    ['evoh-32', 5],
    ['ldpe', 50],
  ]),
  multilayer('PP–PVdC–PP', { gas: 'oxygen', ends: [3.55, 4.55] }, [
    ['cpp', 25],
    ['pvdc-film', 5],
    ['cpp', 25],
  ]),
  multilayer('PP–EVOH–PP', { gas: 'oxygen', ends: [0.9, 0.9] }, [
    ['cpp', 25],
    ['evoh-32', 5],
    ['cpp', 25],
  ]),
  multilayer('HDPE–EVOH–LDPE', { gas: 'oxygen', ends: [1.5, 1.5] }, [
    ['hdpe', 25],
    ['evoh-32', 5],
    ['ldpe', 25],
  ]),
];

function multilayer(
  name: string,
  { gas, ends }: { gas: 'oxygen' | 'water'; ends: readonly [number, number] },
  layers: Layers,
): (typeof multilayers)[number] {
  return {
    name,
    gas,
    gauges: layers.map(([, gaugeUm]) => gaugeUm).join('/'),
    low: ends[0],
    high: ends[1],
    layers,
    test: gas === 'oxygen' ? oxygenTest(25, 0) : WATER_TEST,
  };
}

interface Predicted {
  /** cm³(STP)/(m²·day·atm of oxygen) or g/(m²·day). */
  rate: number;
  isBelowMeasurable: boolean;
}

/** What the engine gives for the wall from the library's single values, nothing fitted. */
export function predict({ layers, test }: Pick<PublishedStructure, 'layers' | 'test'>): Predicted {
  const answer = wallInTest(
    layers.map(([libraryId, gaugeUm]) => libraryLayer(libraryId, gaugeUm)),
    test,
  );
  const rate =
    test.gas === 'oxygen'
      ? fromSi(answer.permeance_mol_per_m2_s_Pa, 'cm3(STP)/(m2*day*atm)')
      : (answer.rate_g_per_m2_day ?? NaN);
  return { rate, isBelowMeasurable: answer.is_below_measurable };
}

/** Rate of a wall of one EVOH grade, 5 µm between 30 µm of LDPE, at 85 % over dry: what a laminate maker states as 5.6. */
export const VENDOR_RISE = 2.8 / 0.5;
export function riseTo85Percent(evohId: string): number {
  const layers: Layers = [
    ['ldpe', 30],
    [evohId, 5],
    ['ldpe', 30],
  ];
  return (
    predict({ layers, test: oxygenTest(23, 0.85) }).rate / predict({ layers, test: oxygenTest(23, 0) }).rate
  );
}
