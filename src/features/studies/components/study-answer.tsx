import { useState } from 'react';
import type { ReactNode } from 'react';
import { View } from 'react-native';
import type { Candidate, StudyResult, StudyWithResult } from '../../../../shared/contract/studies';
import { Choice, SPACE, Select, Stack, TitleBlock, useIsAtLeast } from '../../../ui';
import { layersFromMemory } from '../answer-cautions';
import { decidingLeg } from '../deciding-leg';
import { AnswerSheet } from './answer-sheet';
import { Cautions } from './cautions-sheet';
import { CoursesSheet } from './courses-sheet';
import { InputsSheet } from './inputs-sheet';
import { OwnConditionSheet } from './own-condition-sheet';
import { SideBySideSheet } from './side-by-side-sheet';
import { TransmissionSheet } from './transmission-sheet';
import { TurnedRoundSheet } from './turned-round-sheet';
import { ShareSheet, WallSheet } from './wall-sheet';

const TWO_COLUMNS_FROM_PX = 1240;
const MOST_CHOICES_IN_SIGHT = 3;
/** The candidate's laminate is on every wall of the pack; the first stands for it. */
const WALL = 0;

/** Answer, wall, shares, courses, cautions, title block: from what one came for to what it was made from. */
export function StudyAnswer({ study, result }: { study: StudyWithResult; result: StudyResult }) {
  const [chosenId, setChosenId] = useState<string | null>(null);
  const candidate =
    result.candidates.find((one) => one.laminate_id === chosenId) ?? bestCandidate(result.candidates);
  const hasTwoColumns = useIsAtLeast(TWO_COLUMNS_FROM_PX);
  if (candidate === undefined) return null;
  return (
    <View style={{ gap: SPACE.x4, minWidth: 0 }}>
      {result.candidates.length > 1 ? (
        <WallPicker candidates={result.candidates} chosenId={candidate.laminate_id} onChoose={setChosenId} />
      ) : null}
      <CandidateAnswer
        key={`${result.id} ${candidate.laminate_id}`}
        result={result}
        candidate={candidate}
        hasTwoColumns={hasTwoColumns}
      />
      {result.candidates.length > 1 ? (
        <SideBySideSheet result={result} notes={study.revision.spec.laminate_notes ?? []} />
      ) : null}
      <TitleBlock label="What this answer was made from" cells={titleCells(study, result, candidate)} />
    </View>
  );
}

interface CandidateAnswerProps {
  result: StudyResult;
  candidate: Candidate;
  hasTwoColumns: boolean;
}

function CandidateAnswer({ result, candidate, hasTwoColumns }: CandidateAnswerProps) {
  const wall = candidate.answer.walls[WALL];
  const opening = decidingLeg(candidate, WALL);
  const [legNumber, setLegNumber] = useState(opening.leg);
  const [selectedLayer, setSelectedLayer] = useState<number | undefined>(undefined);
  const leg = wall?.legs.find((one) => one.leg === legNumber) ?? wall?.legs[0];
  const layers = candidate.description.pack.walls[WALL]?.layers ?? [];
  const answer = <AnswerSheet result={result} candidate={candidate} wallIndex={WALL} />;
  const cautions = <Cautions result={result} candidate={candidate} />;
  const courses = <CoursesSheet candidate={candidate} targetDays={result.target_days} />;
  const inputs = <InputsSheet candidate={candidate} wallIndex={WALL} />;
  if (wall === undefined || leg === undefined) {
    return (
      <Stack>
        {answer}
        {courses}
        {cautions}
        {inputs}
      </Stack>
    );
  }
  const selection = { candidate, leg, selectedLayer, onSelectLayer: setSelectedLayer };
  const section = (
    <WallSheet {...selection} wall={wall} legReason={opening.reason} onLegChange={setLegNumber} />
  );
  const shares = <ShareSheet {...selection} />;
  const transmission = <TransmissionSheet wall={wall} />;
  const turned = <TurnedRoundSheet candidate={candidate} wallIndex={WALL} leg={leg} />;
  const own = <OwnConditionSheet layers={layers} />;
  if (!hasTwoColumns) {
    return (
      <Stack>
        {answer}
        {cautions}
        {section}
        {shares}
        {turned}
        {transmission}
        {courses}
        {own}
        {inputs}
      </Stack>
    );
  }
  return (
    <Stack>
      <View style={{ flexDirection: 'row', gap: SPACE.x4, alignItems: 'flex-start' }}>
        <Column>
          {answer}
          {cautions}
          {courses}
          {own}
        </Column>
        <Column>
          {section}
          {shares}
          {turned}
        </Column>
      </View>
      {transmission}
      {inputs}
    </Stack>
  );
}

/** One of two columns side by side. */
function Column({ children }: { children: ReactNode }) {
  return (
    <View style={{ flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0, gap: SPACE.x4 }}>{children}</View>
  );
}

interface WallPickerProps {
  candidates: Candidate[];
  chosenId: string;
  onChoose: (id: string) => void;
}

function WallPicker({ candidates, chosenId, onChoose }: WallPickerProps) {
  const options = candidates.map((one) => ({ value: one.laminate_id, label: one.name }));
  return candidates.length <= MOST_CHOICES_IN_SIGHT ? (
    <Choice label="Wall" value={chosenId} onChange={onChoose} options={options} />
  ) : (
    <Select label="Wall" value={chosenId} onChange={onChoose} options={options} />
  );
}

/** The longest-keeping; one that reaches no limit outlasts all. */
function bestCandidate(candidates: Candidate[]): Candidate | undefined {
  const life = (one: Candidate) => one.answer.shelf_life_days ?? Infinity;
  return candidates.reduce<Candidate | undefined>(
    (best, one) => (best === undefined || life(one) > life(best) ? one : best),
    undefined,
  );
}

const SHOWN_OF_CHECKSUM = 12;

function titleCells(study: StudyWithResult, result: StudyResult, candidate: Candidate) {
  const { fromMemory, all } = layersFromMemory(candidate.layers);
  return [
    { label: 'study', value: study.revision.spec.name },
    { label: 'route', value: result.route.name },
    { label: 'food', value: result.food.name },
    { label: 'pack', value: result.pack.name },
    { label: 'engine', value: result.engine_version },
    { label: 'computed', value: utcMinute(result.created_at) },
    { label: 'data from memory', value: `${fromMemory} of ${all} layers of this wall` },
    { label: 'result', value: `no. ${result.number}` },
    { label: 'checksum', value: result.sha256.slice(0, SHOWN_OF_CHECKSUM) },
  ];
}

function utcMinute(time: string): string {
  const date = new Date(time);
  return Number.isNaN(date.getTime()) ? time : `${date.toISOString().slice(0, 16).replace('T', ' ')} UTC`;
}
