import type { EngineWarning } from '../../../shared/engine/description/evaluation';
import type { Candidate, CandidateLayer } from '../../../shared/contract/studies';

/** Always beside an estimate: what it is not. The first sentence stands in sight, the rest one press away. */
export const ALWAYS_SAID = {
  short: 'An estimate, not a proof: confirm by storage tests before a date goes on a pack.',
  more: [
    'It says nothing about microbial safety. A low-oxygen pack of a low-acid, moist food can be dangerous; that is for a qualified process authority.',
    'Food-contact compliance, allergens and recyclability claims follow local law.',
    'Seals, folds and flexing in real packs usually cost barrier that flat-film data do not show.',
  ],
} as const;

const LEANING: Record<CandidateLayer['leans_on'][number], string> = {
  memory: 'lean on values from memory, which nobody re-read at their source',
  invented: 'lean on values invented for the demo',
  'common-practice': 'lean on common practice, not on a measured value',
};

/** What the answer rests on, in plain words, the weightiest first. */
export function answerCautions(candidate: Candidate): string[] {
  const leaning = (['invented', 'memory', 'common-practice'] as const).flatMap((ground) => {
    const names = candidate.layers
      .filter((layer) => layer.leans_on.includes(ground))
      .map((layer) => layer.material_name);
    if (names.length === 0) return [];
    const unique = [...new Set(names)].join(', ');
    return [`${names.length} of ${candidate.layers.length} layers ${LEANING[ground]}: ${unique}.`];
  });
  return [...leaning, ...engineWords(candidate.answer.warnings)];
}

/** Turning round has a sheet of its own; everything else the engine warns of is said as the engine says it. */
function engineWords(warnings: EngineWarning[]): string[] {
  const said = warnings
    .filter((warning) => warning.code !== 'orientation_matters')
    .map(({ message }) => message.charAt(0).toUpperCase() + message.slice(1));
  return [...new Set(said)];
}

export function layersFromMemory(candidates: Candidate[]): { fromMemory: number; all: number } {
  const layers = candidates.flatMap((candidate) => candidate.layers);
  return {
    fromMemory: layers.filter((layer) => layer.leans_on.includes('memory')).length,
    all: layers.length,
  };
}
