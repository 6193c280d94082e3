import type { MaterialSpec } from '../../../shared/contract/materials';
import type { PackSpec } from '../../../shared/contract/packs';
import type { Verdict } from '../../../shared/contract/studies';

/** The fictional maker whose demo this is. All names are invented. */
export const demoAccount = {
  slug: 'tannhollow',
  name: 'Tannhollow Foods',
  currency: 'EUR',
  timeZone: 'Europe/Amsterdam',
  companies: ['Veldrift Films', 'Osmeria Coatings', 'Marrowgate Grocers'],
} as const;

/** What the demo packs hold, by food of the library. */
export const demoMassesKg = {
  'roasted-hazelnuts': 0.2,
  'freeze-dried-raspberries': 0.05,
  'whole-milk-powder': 0.026,
  'potato-crisps': 0.08,
  'roasted-almonds': 0.2,
} as const;

interface DemoMaterial {
  key: string;
  /** The material of the library that it is made of. */
  basedOn: string;
  name: string;
  defects: NonNullable<Extract<MaterialSpec, { kind: 'foil' }>['defects']>;
  notes: string;
}

/** What the demo adds to the library; its numbers are invented, and its provenance says so. */
export const demoMaterials = [
  {
    key: 'foil-6-3-flexed',
    basedOn: 'foil-6-3',
    name: 'Aluminium foil 6.3 µm, flexed',
    defects: { density_per_m2: 2000, diameter_um: 300 },
    notes:
      'The same foil after folding and forming. How many holes flexing makes and how wide they are is invented for the demo: count yours under a light table before deciding anything.',
  },
] as const satisfies readonly DemoMaterial[];

interface DemoLaminate {
  key: string;
  name: string;
  /** Outside first: a material of the library and its gauge in µm. */
  layers: readonly (readonly [libraryId: string, thicknessUm: number])[];
}

export const demoLaminates = [
  {
    key: 'evoh',
    name: 'PET 12 / PE 60 with EVOH 8',
    layers: [
      ['bopet', 12],
      ['pu-adhesive', 2.5],
      ['hdpe', 60],
      ['tie-resin', 4],
      ['evoh-32', 8],
      ['tie-resin', 4],
      ['pe-sealant-coex', 25],
    ],
  },
  {
    key: 'foil',
    name: 'PET 12 / foil 7 / PE 60',
    layers: [
      ['bopet', 12],
      ['pu-adhesive', 2.5],
      ['foil-7', 7],
      ['pu-adhesive', 2.5],
      ['pe-sealant-coex', 60],
    ],
  },
  {
    key: 'metallised',
    name: 'Metallised PET 12 / PE 60',
    layers: [
      ['bopet', 12],
      ['met-on-bopet', 0.04],
      ['pu-adhesive', 2.5],
      ['pe-sealant-coex', 60],
    ],
  },
  {
    key: 'alox',
    name: 'AlOx PET 12 / CPP 60, clear',
    layers: [
      ['bopet', 12],
      ['alox-on-bopet', 0.02],
      ['pu-adhesive', 2.5],
      ['cpp', 60],
    ],
  },
  {
    key: 'mono-pp',
    name: 'BOPP 20 / metallised BOPP 18',
    layers: [
      ['bopp', 20],
      ['pu-adhesive', 2.5],
      ['met-on-bopp', 0.04],
      ['bopp', 18],
    ],
  },
  {
    key: 'plain-pp',
    name: 'BOPP 20 / CPP 30, no barrier',
    layers: [
      ['bopp', 20],
      ['pu-adhesive', 2.5],
      ['cpp', 30],
    ],
  },
  {
    key: 'siox',
    name: 'SiOx PET 12 / PE 60, clear',
    layers: [
      ['bopet', 12],
      ['siox-on-bopet', 0.08],
      ['pu-adhesive', 2.5],
      ['pe-sealant-coex', 60],
    ],
  },
  {
    key: 'evoh-outside',
    name: 'PET 12 / EVOH 5 / HDPE 100 / PE 25, EVOH on the damp side',
    layers: [
      ['bopet', 12],
      ['pu-adhesive', 2.5],
      ['evoh-32', 5],
      ['tie-resin', 4],
      ['hdpe', 100],
      ['pe-sealant-coex', 25],
    ],
  },
  {
    key: 'evoh-inside',
    name: 'PET 12 / HDPE 100 / EVOH 5 / PE 25, EVOH on the dry side',
    layers: [
      ['bopet', 12],
      ['pu-adhesive', 2.5],
      ['hdpe', 100],
      ['tie-resin', 4],
      ['evoh-32', 5],
      ['tie-resin', 4],
      ['pe-sealant-coex', 25],
    ],
  },
  {
    key: 'paper-foil',
    name: 'Paper 50 / foil 6.3 / PE 30, as delivered',
    layers: [
      ['paper', 50],
      ['pu-adhesive', 2.5],
      ['foil-6-3', 6.3],
      ['pe-sealant-coex', 30],
    ],
  },
  {
    key: 'paper-foil-flexed',
    name: 'Paper 50 / foil 6.3 / PE 30, folded',
    layers: [
      ['paper', 50],
      ['pu-adhesive', 2.5],
      ['foil-6-3-flexed', 6.3],
      ['pe-sealant-coex', 30],
    ],
  },
  {
    key: 'pp-evoh',
    name: 'BOPP 20 / PE 15 / EVOH 5 / PE 20',
    layers: [
      ['bopp', 20],
      ['pu-adhesive', 2.5],
      ['pe-sealant-coex', 15],
      ['tie-resin', 4],
      ['evoh-32', 5],
      ['tie-resin', 4],
      ['pe-sealant-coex', 20],
    ],
  },
  {
    key: 'mono-pe',
    name: 'MDO-PE 25 / HDPE 40 / EVOH 5 / PE 25',
    layers: [
      ['mdo-pe', 25],
      ['pu-adhesive', 2.5],
      ['hdpe', 40],
      ['tie-resin', 4],
      ['evoh-32', 5],
      ['tie-resin', 4],
      ['pe-sealant-coex', 25],
    ],
  },
  {
    key: 'lid-evoh',
    name: 'Lid: PET 12 / PE 20 / EVOH 5 / PE 30',
    layers: [
      ['bopet', 12],
      ['pu-adhesive', 2.5],
      ['pe-sealant-coex', 20],
      ['tie-resin', 4],
      ['evoh-32', 5],
      ['tie-resin', 4],
      ['pe-sealant-coex', 30],
    ],
  },
  {
    key: 'tray-apet',
    name: 'Tray: APET 300 / PE 30',
    layers: [
      ['apet', 300],
      ['pe-sealant-coex', 30],
    ],
  },
] as const satisfies readonly DemoLaminate[];

type LaminateKey = (typeof demoLaminates)[number]['key'];

export const demoPacks = [
  {
    key: 'stand-up',
    spec: {
      name: 'Stand-up pouch 160 × 230 mm',
      form: {
        type: 'pouch',
        width_mm: 160,
        height_mm: 230,
        seal_left_mm: 8,
        seal_right_mm: 8,
        seal_top_mm: 12,
        seal_bottom_mm: 0,
        gusset_depth_mm: 40,
      },
      headspace_cm3: 120,
      starting_headspace_oxygen_percent: 0.5,
      has_seal_path: true,
      leaks: null,
    },
  },
  {
    key: 'flat',
    spec: {
      name: 'Flat pouch 140 × 180 mm',
      form: {
        type: 'pouch',
        width_mm: 140,
        height_mm: 180,
        seal_left_mm: 8,
        seal_right_mm: 8,
        seal_top_mm: 10,
        seal_bottom_mm: 10,
        gusset_depth_mm: 0,
      },
      headspace_cm3: 150,
      starting_headspace_oxygen_percent: 0.5,
      has_seal_path: true,
      leaks: null,
    },
  },
  {
    key: 'sachet',
    spec: {
      name: 'Sachet 80 × 110 mm',
      form: {
        type: 'pouch',
        width_mm: 80,
        height_mm: 110,
        seal_left_mm: 6,
        seal_right_mm: 6,
        seal_top_mm: 8,
        seal_bottom_mm: 8,
        gusset_depth_mm: 0,
      },
      headspace_cm3: 4,
      starting_headspace_oxygen_percent: 1,
      has_seal_path: true,
      leaks: null,
    },
  },
] as const satisfies readonly { key: string; spec: PackSpec }[];

interface DemoTray {
  key: string;
  /** Its form names a laminate, which has no id before it is kept. */
  trayLaminate: LaminateKey;
  name: string;
  trayAreaM2: number;
  lidAreaM2: number;
  headspaceCm3: number;
  startingHeadspaceOxygenPercent: number;
}

export const demoTrays = [
  {
    key: 'almond-tray',
    trayLaminate: 'tray-apet',
    name: 'Tray 190 × 115 × 45 mm with a lid',
    trayAreaM2: 0.045,
    lidAreaM2: 0.022,
    headspaceCm3: 150,
    startingHeadspaceOxygenPercent: 0.5,
  },
] as const satisfies readonly DemoTray[];

interface DemoStudy {
  name: string;
  food: string;
  pack: (typeof demoPacks)[number]['key'] | (typeof demoTrays)[number]['key'];
  route: string;
  laminates: readonly LaminateKey[];
  targetDays: number;
  tags: readonly string[];
  notes: string;
  verdicts?: Partial<Record<LaminateKey, readonly [verdict: Verdict, note: string]>>;
}

/** The newest comes first in the list, so the main one stands last here. test/http/demo.test.ts holds the lessons. */
export const demoStudies: readonly DemoStudy[] = [
  {
    name: 'Almonds in a tray: a better lid does not help',
    food: 'roasted-almonds',
    pack: 'almond-tray',
    route: 'europe-domestic',
    laminates: ['foil', 'alox', 'lid-evoh'],
    targetDays: 120,
    tags: ['tray', 'almonds'],
    notes:
      'Foil, a clear coating or EVOH in the lid: the days hardly move, because nearly all oxygen comes through the plain tray. Improve the tray first.',
  },
  {
    name: 'Hazelnuts in one polymer: PE with EVOH against metal',
    food: 'roasted-hazelnuts',
    pack: 'stand-up',
    route: 'europe-domestic',
    laminates: ['mono-pe', 'metallised', 'foil'],
    targetDays: 240,
    tags: ['hazelnuts', 'one polymer'],
    notes:
      'Nearly all of the first wall is polyethylene, and on this dry route it outlasts the metallised one. It is the heavier wall. Whether it may be called recyclable follows local rules.',
    verdicts: { 'mono-pe': ['chosen', 'Meets the target with nine tenths of its mass in one family.'] },
  },
  {
    name: 'Crisps to Singapore: oxygen stays out, crispness goes',
    food: 'potato-crisps',
    pack: 'flat',
    route: 'europe-to-tropics-by-sea',
    laminates: ['pp-evoh', 'mono-pp', 'alox', 'plain-pp'],
    targetDays: 140,
    tags: ['crisps', 'tropics', 'moisture'],
    notes:
      'The EVOH wall would keep oxygen out for well over a year and is soft in two months. The cheapest metallised wall meets the target; oxygen is what ends it, later.',
    verdicts: {
      'pp-evoh': ['dropped', 'Moisture ends it before the half of the target.'],
      'mono-pp': ['chosen', 'Lightest and cheapest, and it meets the target.'],
    },
  },
  {
    name: 'Milk powder sticks: folded foil is no better than a clear coating',
    food: 'whole-milk-powder',
    pack: 'sachet',
    route: 'europe-domestic',
    laminates: ['paper-foil', 'paper-foil-flexed', 'siox', 'metallised'],
    targetDays: 270,
    tags: ['lesson', 'milk powder', 'pinholes'],
    notes:
      'Lesson: as delivered, the foil outlasts everything. Folded, with the pinholes that folding makes and only paper over them, it ends before the clear SiOx wall does. Pinholes here are invented numbers: count yours. A coating cracks too when it is folded; this one is taken flat.',
    verdicts: { 'paper-foil': ['open', 'Only if the line folds it gently: test packs, not flat foil.'] },
  },
  {
    name: 'Raspberries behind EVOH: oxygen calls it safe, water ends it',
    food: 'freeze-dried-raspberries',
    pack: 'flat',
    route: 'europe-domestic',
    laminates: ['evoh', 'metallised', 'siox'],
    targetDays: 270,
    tags: ['lesson', 'raspberries', 'moisture'],
    notes:
      'Lesson: by oxygen figures alone the EVOH wall is good for well over a year, nearly twice the target. Freeze-dried fruit drinks the little water that comes through and is soft after about six months.',
    verdicts: { evoh: ['dropped', 'Oxygen is met twice over; moisture is not.'] },
  },
  {
    name: 'Hazelnuts at home: EVOH on the damp side is good enough',
    food: 'roasted-hazelnuts',
    pack: 'stand-up',
    route: 'europe-domestic',
    laminates: ['evoh-outside', 'evoh-inside', 'metallised'],
    targetDays: 100,
    tags: ['lesson', 'hazelnuts', 'humidity'],
    notes:
      'Lesson, first half: on a temperate route both EVOH walls meet the target easily. Compare with the same walls to Singapore.',
  },
  {
    name: 'Hazelnuts to Singapore: EVOH on the damp side fails in the tropics',
    food: 'roasted-hazelnuts',
    pack: 'stand-up',
    route: 'europe-to-tropics-by-sea',
    laminates: ['evoh-outside', 'evoh-inside', 'metallised'],
    targetDays: 100,
    tags: ['lesson', 'hazelnuts', 'tropics', 'humidity'],
    notes:
      'Lesson, second half: the same layers in another order. With EVOH outside the HDPE, tropical humidity reaches it and lets the oxygen in within days of landing; behind the HDPE it stays dry. At home both are good.',
    verdicts: {
      'evoh-outside': ['dropped', 'Fails on the tropical leg only.'],
      'evoh-inside': ['chosen', 'Same layers, EVOH kept dry.'],
    },
  },
  {
    name: 'Hazelnuts 200 g to Singapore: foil, metal or a clear wall',
    food: 'roasted-hazelnuts',
    pack: 'stand-up',
    route: 'europe-to-tropics-by-sea',
    laminates: ['evoh', 'metallised', 'siox', 'foil'],
    targetDays: 120,
    tags: ['hazelnuts', 'tropics'],
    notes:
      'Foil is beyond need. The clear coating and the metallised wall meet the target for less. The EVOH wall costs most of the four and fails on moisture, though its oxygen figures look safe.',
  },
];
