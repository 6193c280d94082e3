import type { LaminateSpec } from '../../../shared/contract/laminates';
import type { TypedValue } from '../../../shared/contract/fields';
import { formatExact, fromDisplay, parseNumber, type DisplayUnitSystem } from '../../../shared/units/format';

export type GaugeUnit = 'um' | 'mil';

/** A gauge as it stands in its field. `storedUm` is what was saved, until somebody types another. */
export interface DraftGauge {
  text: string;
  unit: GaugeUnit;
  storedUm: number | null;
}

export interface DraftLayer {
  /** Stays with the layer while it moves; only for this draft. */
  key: string;
  material_id: string;
  material_revision_id: string;
  gauge: DraftGauge;
}

/** A wall while it is being built. The name stays empty as long as the layers may suggest it. */
export interface WallDraft {
  name: string;
  isNameTyped: boolean;
  layers: DraftLayer[];
  nextKey: number;
}

export interface ChosenMaterial {
  material_id: string;
  material_revision_id: string;
}

export type WallEvent =
  | { type: 'layer_added'; material: ChosenMaterial; gauge: DraftGauge }
  | { type: 'layer_moved'; key: string; by: number }
  | { type: 'layer_duplicated'; key: string }
  | { type: 'layer_removed'; key: string }
  | { type: 'gauge_typed'; key: string; text: string; unit: GaugeUnit }
  | { type: 'material_changed'; key: string; material: ChosenMaterial; gauge?: DraftGauge }
  | { type: 'turned_round' }
  | { type: 'name_typed'; name: string }
  | { type: 'suggested_name_taken' };

export const EMPTY_WALL: WallDraft = { name: '', isNameTyped: false, layers: [], nextKey: 1 };

export function wallAfter(wall: WallDraft, event: WallEvent): WallDraft {
  switch (event.type) {
    case 'layer_added':
      return withNewLayer(wall, { ...event.material, gauge: event.gauge }, wall.layers.length);
    case 'layer_moved':
      return { ...wall, layers: moved(wall.layers, event.key, event.by) };
    case 'layer_duplicated': {
      const index = wall.layers.findIndex((layer) => layer.key === event.key);
      const original = wall.layers[index];
      return original ? withNewLayer(wall, original, index + 1) : wall;
    }
    case 'layer_removed':
      return { ...wall, layers: wall.layers.filter((layer) => layer.key !== event.key) };
    case 'gauge_typed':
      return withLayer(wall, event.key, { gauge: { text: event.text, unit: event.unit, storedUm: null } });
    case 'material_changed':
      return withLayer(wall, event.key, {
        ...event.material,
        ...(event.gauge === undefined ? {} : { gauge: event.gauge }),
      });
    case 'turned_round':
      return { ...wall, layers: [...wall.layers].reverse() };
    case 'name_typed':
      return { ...wall, name: event.name, isNameTyped: true };
    case 'suggested_name_taken':
      return { ...wall, name: '', isNameTyped: false };
  }
}

function withNewLayer(wall: WallDraft, layer: Omit<DraftLayer, 'key'>, index: number): WallDraft {
  const added: DraftLayer = { ...layer, key: `layer-${wall.nextKey}` };
  return { ...wall, layers: wall.layers.toSpliced(index, 0, added), nextKey: wall.nextKey + 1 };
}

function withLayer(wall: WallDraft, key: string, changes: Partial<DraftLayer>): WallDraft {
  return {
    ...wall,
    layers: wall.layers.map((layer) => (layer.key === key ? { ...layer, ...changes } : layer)),
  };
}

function moved(layers: DraftLayer[], key: string, by: number): DraftLayer[] {
  const from = layers.findIndex((layer) => layer.key === key);
  const layer = layers[from];
  const to = from + by;
  if (!layer || to < 0 || to >= layers.length) return layers;
  return layers.toSpliced(from, 1).toSpliced(to, 0, layer);
}

function gaugeUnitOf(unitSystem: DisplayUnitSystem): GaugeUnit {
  return unitSystem === 'metric' ? 'um' : 'mil';
}

/** µm of what stands in the field; NaN where that is no number. */
export function gaugeUm(gauge: DraftGauge): number {
  if (gauge.storedUm !== null) return gauge.storedUm;
  const value = parseNumber(gauge.text);
  return gauge.unit === 'um' ? value : fromDisplay(value, 'thickness_um', 'us_customary');
}

/** A gauge that somebody types in the reader's unit. */
export function typedGauge(text: string, unitSystem: DisplayUnitSystem): DraftGauge {
  return { text, unit: gaugeUnitOf(unitSystem), storedUm: null };
}

/** A stored gauge as it enters a field, in the reader's unit. */
export function gaugeFromUm(thicknessUm: number, unitSystem: DisplayUnitSystem): DraftGauge {
  const unit = gaugeUnitOf(unitSystem);
  const shown = unit === 'um' ? thicknessUm : thicknessUm / 25.4;
  return { text: plainFigures(shown), unit, storedUm: thicknessUm };
}

/** A kept laminate as a draft; what was typed comes back as it was typed. */
export function draftFromSpec(spec: LaminateSpec, unitSystem: DisplayUnitSystem): WallDraft {
  const layers = spec.layers.map((layer, index): DraftLayer => {
    const typed = spec.typed?.[gaugePath(index)];
    return {
      key: `layer-${index + 1}`,
      material_id: layer.material_id,
      material_revision_id: layer.material_revision_id,
      gauge:
        typed?.unit === 'mil'
          ? { text: plainFigures(typed.value), unit: 'mil', storedUm: layer.thickness_um }
          : gaugeFromUm(layer.thickness_um, unitSystem),
    };
  });
  return { name: spec.name, isNameTyped: true, layers, nextKey: layers.length + 1 };
}

/** What is sent: µm for every gauge, and beside it what was typed in another unit. */
export function specFromDraft(wall: WallDraft, suggestedName: string): LaminateSpec {
  const typed: Record<string, TypedValue> = {};
  wall.layers.forEach((layer, index) => {
    const value = parseNumber(layer.gauge.text);
    if (layer.gauge.unit === 'mil' && Number.isFinite(value) && matchesStored(value, layer.gauge)) {
      typed[gaugePath(index)] = { value, unit: 'mil' };
    }
  });
  return {
    name: wall.isNameTyped ? wall.name.trim() : suggestedName,
    layers: wall.layers.map((layer) => ({
      material_id: layer.material_id,
      material_revision_id: layer.material_revision_id,
      thickness_um: gaugeUm(layer.gauge),
    })),
    ...(Object.keys(typed).length === 0 ? {} : { typed }),
  };
}

function gaugePath(index: number): string {
  return `layers[${index}].thickness_um`;
}

/** A stored µm shown rounded in mil was not typed in mil. */
function matchesStored(valueMil: number, gauge: DraftGauge): boolean {
  if (gauge.storedUm === null) return true;
  return Math.abs(valueMil * 25.4 - gauge.storedUm) <= 1e-9 * gauge.storedUm;
}

/** A number as a person would type it: no grouping, no typographic minus. */
function plainFigures(value: number): string {
  const figures = formatExact(value);
  return figures.includes('×') ? String(value) : figures.replace(/\u00a0/g, '').replace('−', '-');
}
