import { View } from 'react-native';
import type { Candidate, StudyResult } from '../../../../shared/contract/studies';
import { ChartWithTable, DaysRuler, MiniSection } from '../../../charts';
import { Body, Figure, HAIRLINE_PX, SPACE, Sheet, Small, useTheme } from '../../../ui';
import {
  LIMIT_WORDS,
  answerSentence,
  daysFigures,
  limitRows,
  plainSentence,
  type LimitRow,
} from '../answer-words';
import { answerReason } from '../answer-reason';
import { drawnLayers } from '../drawn-layers';
import { useFigures } from '../use-figures';
import { AnswerSentence } from './answer-sentence';

export interface AnswerSheetProps {
  result: StudyResult;
  wallIndex: number;
  /** The wall whose limits are listed. */
  candidate: Candidate;
}

/** The answer first: the sentence, the ruler of days, both limits. */
export function AnswerSheet({ result, candidate, wallIndex }: AnswerSheetProps) {
  const show = useFigures();
  const targetDays = result.target_days;
  const horizonDays = candidate.description.horizon_days;
  const sentence = answerSentence(candidate.answer, { targetDays, horizonDays });
  const rows = limitRows(candidate.answer, candidate.description.limits, {
    horizonDays,
    targetDays,
    unitSystem: show.unitSystem,
  });
  return (
    <Sheet>
      <View style={{ gap: SPACE.x1 }}>
        <AnswerSentence parts={sentence} />
        {result.candidates.length > 1 ? <Small>{candidate.name}</Small> : null}
        {answerReason(candidate, wallIndex, show).map((words) => (
          <Body key={words} tone="second">
            {words}
          </Body>
        ))}
      </View>
      <ChartWithTable
        label="Table of the ruler"
        table={{
          caption: 'Days on the shelf',
          columns: [
            { key: 'wall', title: 'Wall' },
            { key: 'days', title: 'Days', kind: 'figure' },
            { key: 'target', title: 'Target', kind: 'figure' },
            { key: 'ends', title: 'Ends by' },
          ],
          rows: result.candidates.map((one) => ({
            id: one.laminate_id,
            wall: one.name,
            days: lifeFigures(one, targetDays),
            target: daysFigures(targetDays),
            ends:
              one.answer.first_limit === null
                ? 'no limit reached'
                : LIMIT_WORDS[one.answer.first_limit].cause,
          })),
        }}
      >
        <DaysRuler
          name="Days on the shelf"
          sentence={plainSentence(sentence)}
          targetDays={targetDays}
          formatDays={show.tick}
          entries={result.candidates.map((one) => ({
            id: one.laminate_id,
            label: one.name,
            days: one.answer.shelf_life_days,
            figures: lifeFigures(one, targetDays),
            cause:
              one.answer.first_limit === null
                ? null
                : {
                    words: LIMIT_WORDS[one.answer.first_limit].cause,
                    gas: LIMIT_WORDS[one.answer.first_limit].gas,
                  },
            aside: <MiniSection layers={drawnLayers(one, show)} />,
          }))}
        />
      </ChartWithTable>
      <View role="list" aria-label="Limits">
        {rows.map((row) => (
          <LimitLine key={row.name} row={row} isAlone={rows.length === 1} />
        ))}
      </View>
    </Sheet>
  );
}

function lifeFigures(candidate: Candidate, targetDays: number): string {
  const { shelf_life_days: days } = candidate.answer;
  return days === null
    ? `beyond ${daysFigures(candidate.description.horizon_days)}`
    : daysFigures(days, targetDays);
}

function LimitLine({ row, isAlone }: { row: LimitRow; isAlone: boolean }) {
  const { colors } = useTheme();
  return (
    <View
      role="listitem"
      style={{
        flexDirection: 'row',
        justifyContent: 'space-between',
        alignItems: 'baseline',
        gap: SPACE.x3,
        paddingVertical: SPACE.x2,
        borderTopWidth: HAIRLINE_PX,
        borderTopColor: colors.lineFaint,
      }}
    >
      <View style={{ flexShrink: 1, minWidth: 0 }}>
        <Body tone={row.gas} weight="semibold">
          {row.label}
        </Body>
        <Small>{`limit ${row.limit}`}</Small>
      </View>
      <View style={{ flexShrink: 1, alignItems: 'flex-end' }}>
        <Figure value={row.outcome} isStrong={row.isFirst} />
        {row.isFirst && !isAlone ? <Small tone="ink">comes first</Small> : null}
        {row.detail === '' ? null : <Small align="right">{row.detail}</Small>}
      </View>
    </View>
  );
}
