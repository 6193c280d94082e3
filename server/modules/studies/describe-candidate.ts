import type { FoodSpec } from '../../../shared/contract/foods';
import type { KeptThing, Revision } from '../../../shared/contract/kept-things';
import type { LaminateLayer, LaminateSpec } from '../../../shared/contract/laminates';
import type { MaterialSpec } from '../../../shared/contract/materials';
import type { PackSpec } from '../../../shared/contract/packs';
import type { CandidateLayer } from '../../../shared/contract/studies';
import {
  pouchArea,
  type EvaluationDescription,
  type LayerDescription,
  type SealDescription,
} from '../../../shared/engine';
import type { StudyInputs } from './load-inputs';

interface Layer extends LaminateLayer {
  material: MaterialSpec;
}

/** What the engine is asked about one laminate of a study. */
export function describeCandidate(
  laminate: KeptThing<LaminateSpec>,
  {
    food,
    pack,
    route,
    materialRevisions,
  }: Pick<StudyInputs, 'food' | 'pack' | 'route' | 'materialRevisions'>,
  targetDays: number,
): { description: EvaluationDescription; layers: CandidateLayer[] } {
  const layers = laminate.revision.spec.layers.map((layer) => ({
    ...layer,
    material: pinnedSpec(layer, materialRevisions),
  }));
  const foodSpec = food.revision.spec;
  const description: EvaluationDescription = {
    pack: describePack(pack.revision.spec, layers),
    food: describeFood(foodSpec),
    absorber_capacity_cm3_STP: foodSpec.absorber_capacity_cm3_STP,
    route: route.revision.spec.route,
    limits: foodSpec.limits,
    horizon_days: route.revision.spec.horizon_days,
    target_days: targetDays,
  };
  return { description, layers: layers.map(candidateLayer) };
}

function pinnedSpec(
  layer: LaminateLayer,
  revisions: ReadonlyMap<string, Revision<MaterialSpec>>,
): MaterialSpec {
  const revision = revisions.get(layer.material_revision_id);
  if (!revision) throw new Error(`Material revision ${layer.material_revision_id} is pinned but missing.`);
  return revision.spec;
}

function describeFood({ food }: FoodSpec): EvaluationDescription['food'] {
  // The contract's lazy isotherm schema hides what it has checked from the type.
  return food as EvaluationDescription['food'];
}

function describePack(spec: PackSpec, layers: readonly Layer[]): EvaluationDescription['pack'] {
  const { form } = spec;
  const areaM2 = form.type === 'pouch' ? pouchArea(form).area_m2 : form.area_m2;
  return {
    walls: [{ name: 'wall', area_m2: areaM2, layers: layers.map(describeLayer) }],
    headspace_cm3: spec.headspace_cm3,
    starting_headspace_oxygen_percent: spec.starting_headspace_oxygen_percent,
    seal: describeSeal(spec, layers),
    leaks: spec.leaks ?? undefined,
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
    kind: material.kind,
    thickness_um,
    leans_on: WEAK_KINDS.filter((kind) => kinds.some((one) => one === kind)),
  };
}
