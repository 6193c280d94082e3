import type { PackSpec } from '../../../shared/contract/packs';

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
} as const;

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
] as const satisfies readonly DemoLaminate[];

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

interface DemoStudy {
  name: string;
  food: string;
  pack: (typeof demoPacks)[number]['key'];
  route: string;
  laminate: (typeof demoLaminates)[number]['key'];
  targetDays: number;
  notes: string;
}

/** The newest comes first in the list, so the main one stands last here. */
export const demoStudies = [
  {
    name: 'Milk powder sachets, foil',
    food: 'whole-milk-powder',
    pack: 'sachet',
    route: 'europe-domestic',
    laminate: 'foil',
    targetDays: 365,
    notes: 'Foil leaves the seal as the only way in.',
  },
  {
    name: 'Freeze-dried raspberries, metallised pouch',
    food: 'freeze-dried-raspberries',
    pack: 'flat',
    route: 'europe-domestic',
    laminate: 'metallised',
    targetDays: 270,
    notes: 'Metal keeps the water out for long; oxygen is what ends it.',
  },
  {
    name: 'Hazelnuts 200 g to Singapore',
    food: 'roasted-hazelnuts',
    pack: 'stand-up',
    route: 'europe-to-tropics-by-sea',
    laminate: 'evoh',
    targetDays: 120,
    notes:
      'A humidity-sensitive barrier on a tropical route: oxygen figures alone would call it safe, water ends it.',
  },
] as const satisfies readonly DemoStudy[];
