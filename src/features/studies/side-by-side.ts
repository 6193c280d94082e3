import type { Candidate, LaminateNote, MakeUp } from '../../../shared/contract/studies';
import { formatNumber } from '../../../shared/units/format';
import { LIMIT_WORDS, daysFigures } from './answer-words';
import type { Figures } from './use-figures';

/** A figure, or a dash with what is missing for it. */
export interface CellWords {
  figures: string;
  missing: string;
}

export interface SideBySideRow {
  id: string;
  wall: string;
  /** 'chosen' or 'dropped'; '' while open. */
  verdict: string;
  note: string;
  days: string;
  ends: string;
  price: CellWords;
  mass: CellWords;
  ultraviolet: CellWords;
  visible: CellWords;
  family: CellWords;
}

const OLD_RESULT = 'not in this older result; run it again';

/** Every wall of a study by what it keeps, costs, weighs and lets shine through. */
export function sideBySideRows(
  candidates: Candidate[],
  options: { targetDays: number; notes: LaminateNote[]; show: Figures },
): SideBySideRow[] {
  return candidates.map((candidate) => {
    // A result from before the make-up came in has no such field.
    const { make_up: makeUp }: Partial<Candidate> = candidate;
    const said = options.notes.find((note) => note.laminate_id === candidate.laminate_id);
    const { first_limit: firstLimit, shelf_life_days: days } = candidate.answer;
    return {
      id: candidate.laminate_id,
      wall: candidate.name,
      verdict: said === undefined || said.verdict === 'open' ? '' : said.verdict,
      note: said?.note ?? '',
      days:
        days === null
          ? `beyond ${daysFigures(candidate.description.horizon_days)}`
          : daysFigures(days, options.targetDays),
      ends: firstLimit === null ? 'no limit reached' : LIMIT_WORDS[firstLimit].cause,
      ...(makeUp === undefined ? unknownCells() : makeUpCells(makeUp, options.show)),
    };
  });
}

type MadeOfCells = Pick<SideBySideRow, 'price' | 'mass' | 'ultraviolet' | 'visible' | 'family'>;

function unknownCells(): MadeOfCells {
  const unknown = { figures: '–', missing: OLD_RESULT };
  return {
    price: unknown,
    mass: { figures: '–', missing: '' },
    ultraviolet: { figures: '–', missing: '' },
    visible: { figures: '–', missing: '' },
    family: { figures: '–', missing: '' },
  };
}

function makeUpCells(makeUp: MakeUp, show: Figures): MadeOfCells {
  const { price_per_pack: price, mass_g_per_pack: massG, light } = makeUp;
  const largest = makeUp.family_shares[0];
  const noLight = missingOf('no light data', makeUp.light_missing);
  return {
    price: cell(
      price === null ? null : `${formatNumber(price)}\u00a0${makeUp.currency}`,
      missingOf('no price', makeUp.price_missing),
    ),
    mass: cell(
      massG === null ? null : show.text(massG / 1000, 'mass_kg'),
      missingOf('no density', makeUp.mass_missing),
    ),
    ultraviolet: cell(light === null ? null : show.percent(light.uv_350nm), noLight),
    visible: cell(light === null ? null : show.percent(light.visible_550nm), noLight),
    family: cell(
      largest === undefined ? null : `${largest.family} ${show.percent(largest.share)}`,
      missingOf('no density', makeUp.mass_missing),
    ),
  };
}

function cell(figures: string | null, missing: string): CellWords {
  return figures === null ? { figures: '–', missing } : { figures, missing: '' };
}

function missingOf(what: string, materials: string[]): string {
  return materials.length === 0 ? '' : `${what}: ${materials.join(', ')}`;
}
