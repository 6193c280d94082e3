/** The fields that a layer is read from, whatever they hold: a description may be anything until it is read. */
export interface LayerFields {
  kind?: unknown;
  name?: unknown;
  thickness_um?: unknown;
  oxygen?: GasFields | null;
  water?: GasFields | null;
  defects?: { density_per_m2?: unknown; diameter_um?: unknown } | null;
}

interface GasFields {
  permeability_mol_m_per_m2_s_Pa?: unknown;
  permeance_mol_per_m2_s_Pa?: unknown;
  reference_temperature_C?: unknown;
  activation_energy_J_per_mol?: unknown;
  reference_relative_humidity?: unknown;
  measured_temperature_min_C?: unknown;
  measured_temperature_max_C?: unknown;
  humidity_curve?: { relative_humidity?: unknown; factor?: unknown } | null;
}

/** A copy of all that a layer is read from. */
export function copyOfLayer(layer: LayerFields): LayerFields {
  const copyOfGas = (gas: GasFields | null | undefined): GasFields | null | undefined =>
    gas && {
      ...gas,
      humidity_curve: gas.humidity_curve && {
        relative_humidity: copyOfList(gas.humidity_curve.relative_humidity),
        factor: copyOfList(gas.humidity_curve.factor),
      },
    };
  return {
    kind: layer.kind,
    name: layer.name,
    thickness_um: layer.thickness_um,
    oxygen: copyOfGas(layer.oxygen),
    water: copyOfGas(layer.water),
    defects: layer.defects && { ...layer.defects },
  };
}

const copyOfList = (list: unknown): unknown => (Array.isArray(list) ? [...list] : list);

/** Whether a layer would be read as its copy was. Cost: some 50 ns. */
export function isSameLayer(layer: LayerFields, copy: LayerFields): boolean {
  return (
    layer.kind === copy.kind &&
    layer.name === copy.name &&
    layer.thickness_um === copy.thickness_um &&
    isSameGas(layer.oxygen, copy.oxygen) &&
    isSameGas(layer.water, copy.water) &&
    (layer.defects === copy.defects ||
      (!!layer.defects &&
        !!copy.defects &&
        layer.defects.density_per_m2 === copy.defects.density_per_m2 &&
        layer.defects.diameter_um === copy.defects.diameter_um))
  );
}

function isSameGas(gas: GasFields | null | undefined, copy: GasFields | null | undefined): boolean {
  if (!gas || !copy) return gas === copy;
  if (
    gas.permeability_mol_m_per_m2_s_Pa !== copy.permeability_mol_m_per_m2_s_Pa ||
    gas.permeance_mol_per_m2_s_Pa !== copy.permeance_mol_per_m2_s_Pa ||
    gas.reference_temperature_C !== copy.reference_temperature_C ||
    gas.activation_energy_J_per_mol !== copy.activation_energy_J_per_mol ||
    gas.reference_relative_humidity !== copy.reference_relative_humidity ||
    gas.measured_temperature_min_C !== copy.measured_temperature_min_C ||
    gas.measured_temperature_max_C !== copy.measured_temperature_max_C
  ) {
    return false;
  }
  const curve = gas.humidity_curve;
  const before = copy.humidity_curve;
  if (!curve || !before) return curve === before;
  return (
    isSameList(curve.relative_humidity, before.relative_humidity) && isSameList(curve.factor, before.factor)
  );
}

function isSameList(list: unknown, copy: unknown): boolean {
  if (!Array.isArray(list) || !Array.isArray(copy) || list.length !== copy.length) return false;
  for (let k = 0; k < list.length; k++) if (list[k] !== copy[k]) return false;
  return true;
}
