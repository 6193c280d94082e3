import type { FoodSpec } from '../../../shared/contract/foods';
import type { Revision } from '../../../shared/contract/kept-things';
import type { LaminateLayer } from '../../../shared/contract/laminates';
import type { MaterialSpec } from '../../../shared/contract/materials';
import type { PackSpec } from '../../../shared/contract/packs';
import type { CandidateLayer } from '../../../shared/contract/studies';
import {
  packMakeUp,
  pouchArea,
  pouchCutArea,
  type EvaluationDescription,
  type LayerDescription,
  type MakeUpLayer,
  type PackMakeUp,
  type SealDescription,
} from '../../../shared/engine';
import type { LaminateAtRevision, StudyInputs } from './load-inputs';

interface Layer extends LaminateLayer {
  material: MaterialSpec;
}

type Surroundings = Pick<StudyInputs, 'food' | 'pack' | 'route' | 'tray' | 'materialRevisions'>;

interface DescribedCandidate {
  description: EvaluationDescription;
  layers: CandidateLayer[];
  makeUp: PackMakeUp;
}

/** What the engine is asked about one laminate of a study, and what a pack of it is made of. */
export function describeCandidate(
  laminate: LaminateAtRevision,
  { food, pack, route, tray, materialRevisions }: Surroundings,
  targetDays: number,
): DescribedCandidate {
  const layers = layersOf(laminate, materialRevisions);
  const trayLayers = tray && layersOf(tray, materialRevisions);
  const foodSpec = food.revision.spec;
  const packSpec = pack.revision.spec;
  const walls = wallsOf(packSpec.form, layers, trayLayers);
  const description: EvaluationDescription = {
    pack: describePack(packSpec, walls),
    food: describeFood(foodSpec),
    absorber_capacity_cm3_STP: foodSpec.absorber_capacity_cm3_STP,
    route: route.revision.spec.route,
    limits: foodSpec.limits,
    horizon_days: route.revision.spec.horizon_days,
    target_days: targetDays,
  };
  const [own, ...others] = walls;
  const makeUp = packMakeUp([makeUpWall(own), ...others.map(makeUpWall)]);
  return { description, layers: layers.map(candidateLayer), makeUp };
}

/** The layers of a laminate as a drawing needs them. */
export function describeLayers(
  laminate: LaminateAtRevision,
  revisions: Surroundings['materialRevisions'],
): CandidateLayer[] {
  return layersOf(laminate, revisions).map(candidateLayer);
}

function layersOf({ revision }: LaminateAtRevision, revisions: Surroundings['materialRevisions']): Layer[] {
  return revision.spec.layers.map((layer) => ({ ...layer, material: pinnedSpec(layer, revisions) }));
}

function pinnedSpec(
  layer: LaminateLayer,
  revisions: ReadonlyMap<string, Revision<MaterialSpec>>,
): MaterialSpec {
  const revision = revisions.get(layer.material_revision_id);
  if (!revision) throw new Error(`Material revision ${layer.material_revision_id} is pinned but missing.`);
  return revision.spec;
}

/** One wall of a pack: what gas crosses, and what is cut for it. */
interface Wall {
  name: string;
  areaM2: number;
  cutAreaM2: number;
  layers: readonly Layer[];
}

/** The candidate's own wall first. */
function wallsOf(
  form: PackSpec['form'],
  layers: readonly Layer[],
  trayLayers: readonly Layer[] | null,
): [Wall, ...Wall[]] {
  if (form.type === 'pouch') {
    const { area_m2: areaM2 } = pouchArea(form);
    return [{ name: 'wall', areaM2, cutAreaM2: pouchCutArea(form), layers }];
  }
  if (form.type === 'area') {
    return [{ name: 'wall', areaM2: form.area_m2, cutAreaM2: form.area_m2, layers }];
  }
  if (!trayLayers) throw new Error('A tray came without its layers.');
  return [
    { name: 'lid', areaM2: form.lid_area_m2, cutAreaM2: form.lid_area_m2, layers },
    { name: 'tray', areaM2: form.tray_area_m2, cutAreaM2: form.tray_area_m2, layers: trayLayers },
  ];
}

function describeFood({ food }: FoodSpec): EvaluationDescription['food'] {
  // The contract's lazy isotherm schema hides what it has checked from the type.
  return food as EvaluationDescription['food'];
}

function describePack(spec: PackSpec, walls: readonly [Wall, ...Wall[]]): EvaluationDescription['pack'] {
  return {
    walls: walls.map(({ name, areaM2, layers }) => ({
      name,
      area_m2: areaM2,
      layers: layers.map(describeLayer),
    })),
    headspace_cm3: spec.headspace_cm3,
    starting_headspace_oxygen_percent: spec.starting_headspace_oxygen_percent,
    seal: describeSeal(spec, walls[0].layers),
    leaks: spec.leaks ?? undefined,
  };
}

function makeUpWall({ cutAreaM2, layers }: Wall) {
  return { cut_area_m2: cutAreaM2, layers: layers.map(makeUpLayer) };
}

function makeUpLayer({ material, thickness_um }: Layer): MakeUpLayer {
  const { name, polymer_family, kind, density_kg_per_m3, price_per_kg, price_per_m2 } = material;
  const common = {
    material_name: name,
    polymer_family,
    kind,
    thickness_um,
    density_kg_per_m3,
    price_per_kg,
    price_per_m2,
  };
  if (material.kind === 'foil') return { ...common, defects: material.defects ?? undefined };
  if (material.kind === 'coating') return { ...common, transmission: material.light?.whole };
  return {
    ...common,
    transmission: material.light?.whole,
    transmission_per_um: material.light?.per_um,
  };
}

function describeLayer({ material, thickness_um }: Layer): LayerDescription {
  const { name } = material;
  if (material.kind === 'foil')
    return { kind: 'foil', name, thickness_um, defects: material.defects ?? undefined };
  if (material.kind === 'film') {
    return { kind: 'film', name, thickness_um, oxygen: material.oxygen.gas, water: material.water.gas };
  }
  return {
    kind: 'coating',
    name,
    thickness_um,
    oxygen: material.oxygen.gas,
    water: material.water.gas,
    defects: material.defects ?? undefined,
  };
}

/**
 * Gas creeps edgewise through both sealant layers: the innermost film, twice. Seals of unequal width conduct as one
 * of width Σ length / Σ (length / width). Without a film inside there is no sealant to creep through.
 */
function describeSeal(
  { form, has_seal_path }: PackSpec,
  layers: readonly Layer[],
): SealDescription | undefined {
  const innermost = layers.at(-1);
  if (!has_seal_path || form.type !== 'pouch' || innermost?.material.kind !== 'film') return undefined;
  const { seal_length_m, seal_length_over_width } = pouchArea(form);
  if (!(seal_length_over_width > 0)) return undefined;
  const lengthMm = seal_length_m * 1000;
  return {
    sealant_thickness_um: 2 * innermost.thickness_um,
    length_mm: lengthMm,
    width_mm: lengthMm / seal_length_over_width,
    oxygen: innermost.material.oxygen.gas,
    water: innermost.material.water.gas,
  };
}

/** Fields whose provenance bears on days: coefficients and pinholes, not price or density. */
const COEFFICIENT_FIELD = /^(oxygen|water|pinholes|defects|derivation)\b/;
const WEAK_KINDS = ['memory', 'invented', 'common-practice'] as const;

function candidateLayer({
  material,
  material_id,
  material_revision_id,
  thickness_um,
}: Layer): CandidateLayer {
  const kinds = material.provenance
    .filter((entry) => COEFFICIENT_FIELD.test(entry.field))
    .map((entry) => entry.kind);
  return {
    material_id,
    material_revision_id,
    material_name: material.name,
    material_class: material.material_class,
    polymer_family: material.polymer_family,
    kind: material.kind,
    thickness_um,
    leans_on: WEAK_KINDS.filter((kind) => kinds.some((one) => one === kind)),
  };
}
