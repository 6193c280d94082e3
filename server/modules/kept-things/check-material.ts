import type { MaterialSpec, StatedValue } from '../../../shared/contract/materials';
import {
  gasFromStated,
  InputError,
  layerAt,
  type CoatingGasDescription,
  type FilmGasDescription,
  type LayerDescription,
} from '../../../shared/engine';
import type { FieldFault } from '../../../shared/errors/error-code';
import { inputInvalid } from '../../http/app-error';

type Gas = 'oxygen' | 'water';
type GasBlock = FilmGasDescription | CoatingGasDescription;
const TOLERANCE = 1e-9;

/** The SI coefficients must follow from the value as its source states it. */
export function checkMaterial(spec: MaterialSpec): void {
  const faults =
    spec.kind === 'foil' ? [] : (['oxygen', 'water'] as const).flatMap((gas) => faultsOfGas(spec, gas));
  if (faults.length > 0) throw inputInvalid(faults);
  checkAsLayer(spec);
}

/** The engine must be able to compute with it, so that the fault is told here and not in some later study. */
function checkAsLayer(spec: MaterialSpec): void {
  try {
    layerAt(asLayer(spec), { temperature_C: 23, relative_humidity: 0.5 });
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    const field = error.path
      .replace(/^layer\./, '')
      .replace(/^(oxygen|water)\.(measured_|humidity_curve)/, '$1.stated.$2');
    throw inputInvalid([{ path: `spec.${field}`, value: error.value, message: error.message }]);
  }
}

/** Of 1 µm: any gauge does, and 1 µm leaves even a holed foil its metal. */
function asLayer(spec: MaterialSpec): LayerDescription {
  const common = { name: spec.name, thickness_um: 1 };
  if (spec.kind === 'film') {
    return { ...common, kind: 'film', oxygen: spec.oxygen.gas, water: spec.water.gas };
  }
  const defects = spec.defects ?? undefined;
  return spec.kind === 'foil'
    ? { ...common, kind: 'foil', defects }
    : { ...common, kind: 'coating', oxygen: spec.oxygen.gas, water: spec.water.gas, defects };
}

function faultsOfGas(spec: Exclude<MaterialSpec, { kind: 'foil' }>, gas: Gas): FieldFault[] {
  const given: GasBlock = spec[gas].gas;
  let computed: GasBlock;
  try {
    computed = gasOfStated(spec[gas].stated, { gas, kind: spec.kind });
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    const field = error.path === 'gas_mole_fraction_dry' ? 'oxygen_mole_fraction_dry' : error.path;
    return [{ path: `spec.${gas}.stated.${field}`, value: error.value, message: error.message }];
  }
  return differences(given, computed).map(([key, value, expected]) => ({
    path: `spec.${gas}.gas.${key}`,
    value,
    message: `This does not follow from the stated value, which gives ${String(expected)}.`,
  }));
}

/** The engine's gas block of a stated value. */
function gasOfStated(stated: StatedValue, { gas, kind }: { gas: Gas; kind: 'film' | 'coating' }): GasBlock {
  const { oxygen_mole_fraction_dry, ...rest } = stated;
  return gasFromStated({ ...rest, gas_mole_fraction_dry: oxygen_mole_fraction_dry, gas, kind });
}

function differences(
  given: GasBlock,
  computed: GasBlock,
): [key: string, given: unknown, expected: unknown][] {
  const flatGiven = flatten(given);
  const flatComputed = flatten(computed);
  const keys = new Set([...flatGiven.keys(), ...flatComputed.keys()]);
  return [...keys].flatMap((key): [string, unknown, unknown][] => {
    // An absent energy and an absent reference humidity mean 0 to the engine.
    const one = flatGiven.get(key) ?? ABSENT.get(key);
    const other = flatComputed.get(key) ?? ABSENT.get(key);
    return isSame(one, other) ? [] : [[key, one, other]];
  });
}

const ABSENT = new Map<string, number>([
  ['activation_energy_J_per_mol', 0],
  ['reference_relative_humidity', 0],
]);

function flatten(block: GasBlock): Map<string, number> {
  const flat = new Map<string, number>();
  for (const [key, value] of Object.entries(block)) {
    if (typeof value === 'number') flat.set(key, value);
  }
  block.humidity_curve?.relative_humidity.forEach((value, i) =>
    flat.set(`humidity_curve.relative_humidity[${i}]`, value),
  );
  block.humidity_curve?.factor.forEach((value, i) => flat.set(`humidity_curve.factor[${i}]`, value));
  return flat;
}

function isSame(one: number | undefined, other: number | undefined): boolean {
  if (one === undefined || other === undefined) return one === other;
  return Math.abs(one - other) <= TOLERANCE * Math.max(Math.abs(one), Math.abs(other));
}
