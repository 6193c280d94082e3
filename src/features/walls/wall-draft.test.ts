import { describe, expect, it } from 'vitest';
import {
  draftFromSpec,
  EMPTY_WALL,
  gaugeFromUm,
  gaugeUm,
  specFromDraft,
  wallAfter,
  type WallDraft,
} from './wall-draft';
import { historyAfter, historyOf } from './wall-history';

const PET = { material_id: 'pet', material_revision_id: 'pet-1' };
const EVOH = { material_id: 'evoh', material_revision_id: 'evoh-1' };
const LDPE = { material_id: 'ldpe', material_revision_id: 'ldpe-1' };

function threeLayers(): WallDraft {
  return [
    { material: PET, um: 12 },
    { material: EVOH, um: 5 },
    { material: LDPE, um: 50 },
  ].reduce(
    (wall, { material, um }) =>
      wallAfter(wall, { type: 'layer_added', material, gauge: gaugeFromUm(um, 'metric') }),
    EMPTY_WALL,
  );
}

const materialsOf = (wall: WallDraft) => wall.layers.map((layer) => layer.material_id);

describe('wallAfter', () => {
  it('adds at the inside face, each layer with a key of its own', () => {
    const wall = threeLayers();
    expect(materialsOf(wall)).toEqual(['pet', 'evoh', 'ldpe']);
    expect(new Set(wall.layers.map((layer) => layer.key)).size).toBe(3);
  });

  it('moves within the wall and stays put at its faces', () => {
    const wall = threeLayers();
    const [first, second] = wall.layers;
    expect(materialsOf(wallAfter(wall, { type: 'layer_moved', key: second!.key, by: -1 }))).toEqual([
      'evoh',
      'pet',
      'ldpe',
    ]);
    expect(wallAfter(wall, { type: 'layer_moved', key: first!.key, by: -1 }).layers).toBe(wall.layers);
  });

  it('duplicates beside the original with a fresh key', () => {
    const wall = threeLayers();
    const doubled = wallAfter(wall, { type: 'layer_duplicated', key: wall.layers[1]!.key });
    expect(materialsOf(doubled)).toEqual(['pet', 'evoh', 'evoh', 'ldpe']);
    expect(new Set(doubled.layers.map((layer) => layer.key)).size).toBe(4);
  });

  it('turned round twice is the wall again', () => {
    const wall = threeLayers();
    const turned = wallAfter(wall, { type: 'turned_round' });
    expect(materialsOf(turned)).toEqual(['ldpe', 'evoh', 'pet']);
    expect(wallAfter(turned, { type: 'turned_round' }).layers).toEqual(wall.layers);
  });

  it('keeps the text of a gauge as it was typed', () => {
    const wall = threeLayers();
    const key = wall.layers[0]!.key;
    const typed = wallAfter(wall, { type: 'gauge_typed', key, text: '1 2,5', unit: 'um' });
    expect(typed.layers[0]!.gauge.text).toBe('1 2,5');
    expect(gaugeUm(typed.layers[0]!.gauge)).toBe(12.5);
    const nonsense = wallAfter(wall, { type: 'gauge_typed', key, text: 'thin', unit: 'um' });
    expect(gaugeUm(nonsense.layers[0]!.gauge)).toBeNaN();
  });
});

describe('historyAfter', () => {
  it('takes back one step at a time and brings it again', () => {
    const wall = threeLayers();
    const removed = historyAfter(historyOf(wall), { type: 'layer_removed', key: wall.layers[1]!.key });
    const turned = historyAfter(removed, { type: 'turned_round' });
    expect(materialsOf(turned.present)).toEqual(['ldpe', 'pet']);
    const once = historyAfter(turned, { type: 'undone' });
    expect(materialsOf(once.present)).toEqual(['pet', 'ldpe']);
    const twice = historyAfter(once, { type: 'undone' });
    expect(twice.present).toEqual(wall);
    expect(historyAfter(historyAfter(twice, { type: 'redone' }), { type: 'redone' }).present).toEqual(
      turned.present,
    );
  });

  it('takes a run of typing in one field as one step, until the field is left', () => {
    const wall = threeLayers();
    const key = wall.layers[0]!.key;
    const type = (text: string) => ({ type: 'gauge_typed', key, text, unit: 'um' }) as const;
    const run = ['1', '15', '15.'].map(type).reduce(historyAfter, historyOf(wall));
    expect(run.past).toHaveLength(1);
    const after = historyAfter(historyAfter(run, { type: 'field_left' }), type('16'));
    expect(after.past).toHaveLength(2);
    expect(historyAfter(after, { type: 'undone' }).present.layers[0]!.gauge.text).toBe('15.');
  });

  it('forgets what was undone once something else is done', () => {
    const wall = threeLayers();
    const undone = historyAfter(historyAfter(historyOf(wall), { type: 'turned_round' }), { type: 'undone' });
    const edited = historyAfter(undone, { type: 'name_typed', name: 'Mine' });
    expect(historyAfter(edited, { type: 'redone' })).toBe(edited);
  });
});

describe('specFromDraft', () => {
  it('sends µm and keeps what was typed in mil', () => {
    const wall = threeLayers();
    const inMil = wallAfter(wall, {
      type: 'gauge_typed',
      key: wall.layers[0]!.key,
      text: '0.48',
      unit: 'mil',
    });
    const spec = specFromDraft(inMil, 'PET 0.48');
    expect(spec.layers[0]!.thickness_um).toBe(12.192);
    expect(spec.typed).toEqual({ 'layers[0].thickness_um': { value: 0.48, unit: 'mil' } });
    expect(draftFromSpec(spec, 'metric').layers[0]!.gauge).toEqual({
      text: '0.48',
      unit: 'mil',
      storedUm: 12.192,
    });
  });

  it('leaves a stored gauge exactly alone where it was only shown in mil', () => {
    const stored = specFromDraft(threeLayers(), 'PET 12 / EVOH 5 / LDPE 50');
    const shown = draftFromSpec(stored, 'us_customary');
    expect(shown.layers[0]!.gauge.text).toBe('0.472441');
    expect(specFromDraft(shown, '')).toEqual(stored);
  });

  it('takes the suggested name until one is typed', () => {
    const wall = threeLayers();
    expect(specFromDraft(wall, 'PET 12').name).toBe('PET 12');
    expect(specFromDraft(wallAfter(wall, { type: 'name_typed', name: ' Nuts ' }), 'PET 12').name).toBe(
      'Nuts',
    );
  });
});
