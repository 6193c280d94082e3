import { describe, expect, it } from 'vitest';
import { NEW_STUDY, isStudyDraft, studyFaults, withCreated } from './study-form-values';

const ID = (digit: number) => `00000000-0000-7000-8000-00000000000${digit}`;
const FILLED = {
  ...NEW_STUDY,
  name: 'Roasted hazelnuts',
  food_id: ID(1),
  pack_id: ID(2),
  route_id: ID(3),
  target_days: '270',
  laminate_ids: [ID(4)],
};

describe('the study form', () => {
  it('says at each empty field what it needs', () => {
    expect(studyFaults(NEW_STUDY)).toEqual({
      name: 'Name: enter a name.',
      food_id: 'Food: choose one.',
      pack_id: 'Pack: choose one.',
      route_id: 'Route: choose one.',
      target_days: 'Target: enter a number, more than 0 and at most 36500 days.',
      laminate_ids: ['Wall: choose one.'],
    });
    expect(studyFaults(FILLED)).toEqual({});
  });

  it('puts what concerns the walls together on the last of them', () => {
    expect(studyFaults({ ...FILLED, laminate_ids: [ID(4), ID(4)] })).toEqual({
      laminate_ids: [undefined, 'Walls: choose each wall once.'],
    });
  });

  it('chooses what was made for it and keeps the rest as typed', () => {
    const typed = { ...NEW_STUDY, name: 'Nuts', target_days: '27' };
    expect(withCreated(typed, `foods:${ID(5)}`)).toEqual({ ...typed, food_id: ID(5) });
    expect(withCreated(FILLED, `laminates:${ID(6)}`).laminate_ids).toEqual([ID(4), ID(6)]);
    expect(withCreated(typed, `laminates:${ID(6)}`).laminate_ids).toEqual([ID(6)]);
    expect(withCreated(typed, undefined)).toBe(typed);
  });

  it('drops a kept draft of another shape', () => {
    expect(isStudyDraft({ values: FILLED, baseRevisionId: null })).toBe(true);
    expect(isStudyDraft({ values: { ...FILLED, laminate_ids: ID(4) }, baseRevisionId: null })).toBe(false);
    expect(isStudyDraft(FILLED)).toBe(false);
  });
});
