import { describe, expect, it } from 'vitest';
import { answerSentence, daysFigures, limitRows, plainSentence, shortAnswer } from './answer-words';

const horizon = { targetDays: 270, horizonDays: 3650 };

describe('the answer in words', () => {
  it('says what ends it, on which day, of how many', () => {
    const answer = { limits: {}, first_limit: 'moisture_max_g_per_g' as const, shelf_life_days: 48.23 };
    expect(plainSentence(answerSentence(answer, horizon))).toBe('Ends by moisture on day 48 of 270.');
    expect(answerSentence(answer, horizon)[1]).toEqual({ text: 'moisture', gas: 'water' });
  });

  it('names the target beside a wall that meets it', () => {
    const answer = { limits: {}, first_limit: 'oxygen_uptake_mg_per_kg' as const, shelf_life_days: 515.4 };
    expect(plainSentence(answerSentence(answer, horizon))).toBe(
      'Keeps 515 days; the target is 270. Then ends by oxygen uptake.',
    );
    expect(shortAnswer(515.4, horizon)).toBe('515 d, target 270');
  });

  it('does not promise what lies beyond the horizon', () => {
    const answer = { limits: {}, first_limit: null, shelf_life_days: null };
    expect(plainSentence(answerSentence(answer, horizon))).toBe(
      'No limit is reached by day 3650; the target is 270.',
    );
    expect(shortAnswer(null, horizon)).toBe('beyond 3650 d, target 270');
  });

  it('never rounds a miss up to the target', () => {
    expect(daysFigures(269.8, 270)).toBe('269.8');
    expect(daysFigures(269.99999, 270)).toBe('269.99999');
    expect(daysFigures(269.4, 270)).toBe('269');
    expect(daysFigures(0.352, 270)).toBe('0.35');
  });

  it('gives a limit not reached its value at the horizon and what it settles at', () => {
    const rows = limitRows(
      {
        limits: {
          oxygen_uptake_mg_per_kg: { status: 'not reached', value_at_horizon: 31.26, settles_at: null },
          moisture_max_g_per_g: { status: 'not reached', value_at_horizon: 0.0412, settles_at: 0.05 },
        },
        first_limit: null,
        shelf_life_days: null,
      },
      { oxygen_uptake_mg_per_kg: 60, moisture_max_g_per_g: 0.055 },
      { ...horizon, unitSystem: 'metric' },
    );
    expect(rows.map((row) => row.detail.replaceAll('\u00a0', ' '))).toEqual([
      '31.3 mg/kg on day 3650, still growing',
      '4.12 g/100 g dry on day 3650, settles at 5.00 g/100 g dry',
    ]);
  });
});
