import type { LimitName, LimitsDescription } from '../../../shared/engine/description/storage-description';
import type { EvaluationAnswer, LimitAnswer } from '../../../shared/engine/description/evaluation';
import {
  formatNumber,
  formatQuantity,
  type DisplayKindName,
  type DisplayUnitSystem,
} from '../../../shared/units/format';

/** The gas a limit watches: it decides the hue, nothing else. */
export type LimitGas = 'oxygen' | 'water';

interface LimitWords {
  gas: LimitGas;
  /** As in 'ends by moisture'. */
  cause: string;
  /** As a row is headed. */
  label: string;
  kind: DisplayKindName;
}

export const LIMIT_WORDS: Record<LimitName, LimitWords> = {
  oxygen_uptake_mg_per_kg: {
    gas: 'oxygen',
    cause: 'oxygen uptake',
    label: 'Oxygen taken up',
    kind: 'oxygen_uptake_mg_per_kg',
  },
  headspace_oxygen_percent: {
    gas: 'oxygen',
    cause: 'headspace oxygen',
    label: 'Oxygen in the headspace',
    kind: 'percent',
  },
  moisture_max_g_per_g: {
    gas: 'water',
    cause: 'moisture',
    label: 'Moisture, at most',
    kind: 'moisture_g_per_g',
  },
  moisture_min_g_per_g: {
    gas: 'water',
    cause: 'drying out',
    label: 'Moisture, at least',
    kind: 'moisture_g_per_g',
  },
};

export const LIMIT_ORDER: LimitName[] = [
  'oxygen_uptake_mg_per_kg',
  'headspace_oxygen_percent',
  'moisture_max_g_per_g',
  'moisture_min_g_per_g',
];

/**
 * Days as people read them: whole from 10 up, two figures below; more figures only where rounding would make a
 * miss look like the target met.
 */
export function daysFigures(days: number, targetDays?: number): string {
  const wholeFigures = days >= 10 ? Math.floor(Math.log10(days)) + 1 : 2;
  const shown = formatNumber(days, wholeFigures);
  if (targetDays === undefined || days >= targetDays || shown !== daysFigures(targetDays)) return shown;
  for (let figures = wholeFigures + 1; figures <= 9; figures += 1) {
    const finer = formatNumber(days, figures);
    if (finer !== formatNumber(targetDays, figures)) return finer;
  }
  return shown;
}

/** A piece of the answer's sentence; the cause is drawn in its gas's hue. */
export interface SentencePart {
  text: string;
  gas?: LimitGas;
}

type AnsweredLimits = Pick<EvaluationAnswer, 'limits' | 'first_limit' | 'shelf_life_days'>;

/** 'Ends by moisture on day 48 of 270.' and its kin: what comes before any chart. */
export function answerSentence(
  answer: AnsweredLimits,
  options: { targetDays: number; horizonDays: number },
): SentencePart[] {
  const { targetDays, horizonDays } = options;
  const { first_limit: firstLimit, shelf_life_days: days } = answer;
  if (firstLimit === null || days === null) {
    return [
      {
        text: `No limit is reached by day ${daysFigures(horizonDays)}; the target is ${daysFigures(targetDays)}.`,
      },
    ];
  }
  const { cause, gas } = LIMIT_WORDS[firstLimit];
  if (days === 0) return [{ text: 'Past its ' }, { text: cause, gas }, { text: ' limit when packed.' }];
  const shown = daysFigures(days, targetDays);
  if (days >= targetDays) {
    return [
      { text: `Keeps ${shown} days; the target is ${daysFigures(targetDays)}. Then ends by ` },
      { text: cause, gas },
      { text: '.' },
    ];
  }
  return [
    { text: 'Ends by ' },
    { text: cause, gas },
    { text: ` on day ${shown} of ${daysFigures(targetDays)}.` },
  ];
}

export function plainSentence(parts: SentencePart[]): string {
  return parts.map((part) => part.text).join('');
}

/** '48 d, target 270': the same on a card. */
export function shortAnswer(
  days: number | null,
  options: { targetDays: number; horizonDays: number },
): string {
  const target = `target ${daysFigures(options.targetDays)}`;
  return days === null
    ? `beyond ${daysFigures(options.horizonDays)} d, ${target}`
    : `${daysFigures(days, options.targetDays)} d, ${target}`;
}

export interface LimitRow {
  name: LimitName;
  gas: LimitGas;
  label: string;
  /** '60.0 mg/kg': what the limit is set at. */
  limit: string;
  /** 'day 48' or 'not reached'. */
  outcome: string;
  /** For a limit not reached: where the value stands at the horizon and what it settles at. */
  detail: string;
  isFirst: boolean;
}

export function limitRows(
  answer: AnsweredLimits,
  limits: LimitsDescription,
  options: { horizonDays: number; targetDays: number; unitSystem: DisplayUnitSystem },
): LimitRow[] {
  return LIMIT_ORDER.flatMap((name) => {
    const limitAnswer = answer.limits[name];
    const limit = limits[name];
    if (limitAnswer === undefined || limit === undefined) return [];
    const words = LIMIT_WORDS[name];
    return [
      {
        name,
        gas: words.gas,
        label: words.label,
        limit: formatQuantity(limit, words.kind, { unitSystem: options.unitSystem, isExact: true }).text,
        outcome:
          limitAnswer.status === 'reached'
            ? `day ${daysFigures(limitAnswer.days, options.targetDays)}`
            : 'not reached',
        detail: limitDetail(limitAnswer, words.kind, options),
        isFirst: answer.first_limit === name,
      },
    ];
  });
}

function limitDetail(
  answer: LimitAnswer,
  kind: DisplayKindName,
  { horizonDays, unitSystem }: { horizonDays: number; unitSystem: DisplayUnitSystem },
): string {
  if (answer.status === 'reached') return answer.days === 0 ? 'already past when packed' : '';
  const show = (value: number) => formatQuantity(value, kind, { unitSystem }).text;
  const atHorizon = `${show(answer.value_at_horizon)} on day ${daysFigures(horizonDays)}`;
  if (answer.settles_at === undefined) return atHorizon;
  return answer.settles_at === null
    ? `${atHorizon}, still growing`
    : `${atHorizon}, settles at ${show(answer.settles_at)}`;
}
