import type { Candidate, StudyResult } from '../../../../shared/contract/studies';
import { Disclosure, Notice, Small, Stack } from '../../../ui';
import { ALWAYS_SAID, answerCautions } from '../answer-cautions';
import { useFigures } from '../use-figures';

const MOST_IN_SIGHT = 3;

/** What the answer leans on, what the food asks for, and what no estimate can say. */
export function Cautions({ result, candidate }: { result: StudyResult; candidate: Candidate }) {
  const show = useFigures();
  // A result from before trays came in has no such field.
  const { tray }: Partial<StudyResult['pack']> = result.pack;
  const { weighty, slight } = answerCautions(candidate, { trayLayers: tray?.layers, show });
  const inSight = weighty.slice(0, MOST_IN_SIGHT);
  const rest = [...weighty.slice(MOST_IN_SIGHT), ...slight];
  return (
    <Stack gap="x3">
      {inSight.length + rest.length === 0 ? null : (
        <Notice kind="caution" title="What this answer leans on">
          <Stack gap="x1">
            {inSight.map((words) => (
              <Small key={words} tone="ink">
                {words}
              </Small>
            ))}
            {rest.length === 0 ? null : (
              <Disclosure label={`${rest.length} more`}>
                <Stack gap="x1">
                  {rest.map((words) => (
                    <Small key={words} tone="ink">
                      {words}
                    </Small>
                  ))}
                </Stack>
              </Disclosure>
            )}
          </Stack>
        </Notice>
      )}
      {result.food.cautions.length === 0 ? null : (
        <Notice kind="caution" title={`About ${result.food.name}`}>
          <Stack gap="x1">
            {result.food.cautions.map((words) => (
              <Small key={words} tone="ink">
                {words}
              </Small>
            ))}
          </Stack>
        </Notice>
      )}
      <Notice>
        <Stack gap="x1">
          <Small tone="ink">{ALWAYS_SAID.short}</Small>
          <Disclosure label="What an estimate cannot say">
            <Stack gap="x1">
              {ALWAYS_SAID.more.map((words) => (
                <Small key={words}>{words}</Small>
              ))}
            </Stack>
          </Disclosure>
        </Stack>
      </Notice>
    </Stack>
  );
}
