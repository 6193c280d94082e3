import { useRouter } from 'expo-router';
import { useMemo, useState } from 'react';
import { View } from 'react-native';
import type { LaminateSpec } from '../../../shared/contract/laminates';
import { describeError, type ErrorWords } from '../../api/describe-error';
import type { KeptLaminate } from '../../api/kept-things-queries';
import { addressAfterCreating } from '../../api/kept-forms/return-address';
import { useKeptThingSaver, type KeptThingSaver } from '../../api/kept-forms/use-kept-thing-saver';
import { hasRole, useAccount, useDraft, useUnitSystem } from '../../session';
import {
  Button,
  FailedState,
  Form,
  FormErrors,
  FormSubmit,
  Inline,
  Notice,
  Sheet,
  Small,
  SPACE,
  StatusLine,
  TextField,
  TitleBlock,
  useFieldBinding,
  useIsAtLeast,
} from '../../ui';
import { builtLayers } from './built-layer';
import { LayerList } from './components/layer-list';
import { PermeanceAnswers } from './components/test-answers';
import { WallConflict } from './components/wall-conflict';
import { WallView } from './components/wall-view';
import type { MaterialBook } from './material-book';
import { totalGauge } from './shown-layer';
import { sidesAsText, sidesFromText } from './sides-text';
import { suggestedName } from './suggested-name';
import { useWallEdits, type WallEdits } from './use-wall-edits';
import { draftFromSpec, EMPTY_WALL, gaugeUm, specFromDraft, type WallDraft } from './wall-draft';
import { wallFaults, wallFieldName } from './wall-form';
import { USUAL_SIDES, wallPreview } from './wall-preview';
import { isSavedWallDraft, type SavedWallDraft } from './wall-saved-draft';
import { weakGroundOf } from '../../api/kept-forms/provenance-words';

const SIDE_BY_SIDE_FROM_PX = 900;

export interface WallBuilderProps {
  /** Null for a new wall. */
  opened: KeptLaminate | null;
  book: MaterialBook;
  /** Where somebody waits for the wall that is being made. */
  returnTo?: string;
  /** A material just made for this wall. */
  createdMaterialId?: string;
}

/** A wall while it is built: its layers, and at once what they answer. */
export function WallBuilder({ opened, book, returnTo, createdMaterialId }: WallBuilderProps) {
  const unitSystem = useUnitSystem();
  const account = useAccount();
  const router = useRouter();
  const untouched = useMemo<SavedWallDraft>(
    () => ({
      wall: opened === null ? EMPTY_WALL : draftFromSpec(opened.revision.spec, unitSystem),
      baseRevisionId: opened?.revision.id ?? null,
    }),
    [opened, unitSystem],
  );
  const draft = useDraft(`wall/${opened?.id ?? 'new'}`, untouched, isSavedWallDraft);
  const [start] = useState({ ...draft.content, isRestored: draft.isRestored });
  const saver = useKeptThingSaver(
    { accountId: account.id, collection: 'laminates' },
    opened === null ? null : { id: opened.id, revisionId: start.baseRevisionId ?? opened.revision.id },
  );
  const [said, setSaid] = useState('');
  const nameFor = (wall: WallDraft) => suggestedNameOf(wall, book, unitSystem);
  const toSpec = (wall: WallDraft) => specFromDraft(wall, nameFor(wall));

  const finish = (saved: KeptLaminate | null) => {
    if (saved === null) return;
    draft.clear();
    if (saved.id === opened?.id) {
      setSaid(`Saved. Now at revision ${saved.revision.number}.`);
      return;
    }
    const otherwise = `${account.basePath}/walls/${saved.id}`;
    const created = { collection: 'laminates' as const, id: saved.id };
    router.replace(addressAfterCreating(created, { returnTo, basePath: account.basePath, otherwise }));
  };

  return (
    <Form<WallDraft>
      label="Wall"
      initialValues={start.wall}
      validate={(wall) => wallFaults(wall, nameFor(wall))}
      toFieldName={wallFieldName}
      onSubmit={async (wall) => finish(await saver.save(toSpec(wall)))}
    >
      <BuilderBody
        opened={opened}
        book={book}
        saver={saver}
        isRestored={start.isRestored}
        createdMaterialId={createdMaterialId}
        suggest={nameFor}
        toSpec={toSpec}
        said={said}
        onChange={(wall) => {
          setSaid('');
          if (isUntouched(toSpec(wall), opened)) draft.clear();
          else draft.save({ wall, baseRevisionId: saver.baseRevisionId() });
        }}
        onDropped={draft.clear}
        onFinished={finish}
      />
    </Form>
  );
}

interface BuilderBodyProps {
  opened: KeptLaminate | null;
  book: MaterialBook;
  saver: KeptThingSaver<LaminateSpec>;
  isRestored: boolean;
  /** 'Saved. Now at revision 3.' until the next change. */
  said: string;
  createdMaterialId: string | undefined;
  suggest: (wall: WallDraft) => string;
  toSpec: (wall: WallDraft) => LaminateSpec;
  onChange: (wall: WallDraft) => void;
  onDropped: () => void;
  onFinished: (saved: KeptLaminate | null) => void;
}

function BuilderBody(props: BuilderBodyProps) {
  const { opened, book, saver } = props;
  const unitSystem = useUnitSystem();
  const account = useAccount();
  const isSideBySide = useIsAtLeast(SIDE_BY_SIDE_FROM_PX);
  const edits = useWallEdits(props.onChange);
  const [sides, setSides] = useState(() => sidesAsText(USUAL_SIDES, unitSystem));
  const [isNoticeShown, setNoticeShown] = useState(props.isRestored);
  const [fault, setFault] = useState<ErrorWords | null>(null);
  const { wall } = edits;

  const layers = useMemo(() => builtLayers(wall, book, unitSystem), [wall, book, unitSystem]);
  const preview = useMemo(() => {
    const chosen = sidesFromText(sides, unitSystem);
    return layers === null || chosen === null
      ? null
      : wallPreview(
          layers.map((layer) => layer.description),
          chosen,
        );
  }, [layers, sides, unitSystem]);

  const openDraft = (next: WallDraft) => {
    edits.happened({ type: 'draft_opened', wall: next });
    setNoticeShown(false);
  };
  const settle = (saving: Promise<KeptLaminate | null>) => {
    setFault(null);
    saving.then(props.onFinished, (error: unknown) =>
      setFault(describeError(error, 'The wall could not be saved')),
    );
  };
  const name = wall.isNameTyped ? wall.name : props.suggest(wall);
  const createdName = book.materials.find((material) => material.id === props.createdMaterialId)?.revision
    .spec.name;
  const address = `${account.basePath}/walls/${opened?.id ?? 'new'}`;

  return (
    <>
      {isNoticeShown ? (
        <Notice
          title="Your unsaved changes are back"
          action={
            <Button
              label={opened === null ? 'Begin afresh' : 'Drop them'}
              onPress={() => {
                openDraft(opened === null ? EMPTY_WALL : draftFromSpec(opened.revision.spec, unitSystem));
                props.onDropped();
              }}
            />
          }
        >
          They were kept on this device when the page was left.
        </Notice>
      ) : null}
      {fault === null ? null : <FailedState {...fault} />}
      {saver.conflict === null ? null : (
        <WallConflict
          mine={props.toSpec(wall)}
          theirs={saver.conflict}
          book={book}
          isBusy={saver.isSaving}
          onKeepMine={() => settle(saver.saveOverTheirs(props.toSpec(wall)))}
          onTakeTheirs={() => {
            const theirs = saver.conflict;
            if (theirs === null) return;
            openDraft(draftFromSpec(theirs.revision.spec, unitSystem));
            saver.acceptTheirs();
            props.onDropped();
          }}
          onSaveAsNew={() => settle(saver.saveAsNew(props.toSpec(wall)))}
        />
      )}
      {isSideBySide || preview === null ? null : (
        <View style={{ gap: SPACE.x1 }}>
          <PermeanceAnswers preview={preview} label="The answer now" />
          <Small>Preview, worked out on this device as you change it.</Small>
        </View>
      )}
      <View
        style={{
          flexDirection: isSideBySide ? 'row' : 'column',
          alignItems: isSideBySide ? 'flex-start' : 'stretch',
          gap: SPACE.x4,
        }}
      >
        <View style={{ flex: isSideBySide ? 1 : undefined, minWidth: 0, gap: SPACE.x4 }}>
          <LayerList
            // The material that was just made may come a moment later than the others; then the picker opens on it.
            key={createdName ?? ''}
            edits={edits}
            book={book}
            layers={layers}
            preview={preview}
            newMaterialHref={`${account.basePath}/materials/new?return=${encodeURIComponent(address)}`}
            searchAtFirst={createdName ?? ''}
          />
          {hasRole(account, ['engineer']) ? (
            <SaveSheet edits={edits} opened={opened} suggestion={props.suggest(wall)} said={props.said} />
          ) : (
            <Notice>Try what you like; saving walls is for engineers.</Notice>
          )}
        </View>
        <View style={{ flex: isSideBySide ? 1 : undefined, minWidth: 0 }}>
          <WallView name={name} layers={layers} preview={preview} sides={sides} onSidesChange={setSides} />
        </View>
      </View>
      <TitleBlock label="Made from" cells={titleBlockCells(wall, opened, { book, unitSystem })} />
    </>
  );
}

interface SaveSheetProps {
  edits: WallEdits;
  opened: KeptLaminate | null;
  suggestion: string;
  said: string;
}

function SaveSheet({ edits, opened, suggestion, said }: SaveSheetProps) {
  const { wall, happened } = edits;
  const field = useFieldBinding('name');
  return (
    <Sheet title="Name and save">
      <TextField
        id={field.id}
        label="Name"
        value={wall.isNameTyped ? wall.name : suggestion}
        hint={wall.isNameTyped ? undefined : 'Follows the layers until you type a name.'}
        error={field.error}
        onChange={(name) => happened({ type: 'name_typed', name })}
        onBlur={() => {
          field.onBlur();
          happened({ type: 'field_left' });
        }}
      />
      {wall.isNameTyped && suggestion !== '' && wall.name !== suggestion ? (
        <Button
          label={`Call it ${suggestion}`}
          kind="quiet"
          onPress={() => happened({ type: 'suggested_name_taken' })}
        />
      ) : null}
      <FormErrors />
      <Inline>
        <FormSubmit label={opened === null ? 'Save wall' : 'Save as a new revision'} busyLabel="Saving…" />
      </Inline>
      {opened === null ? null : (
        <Small>{`Revision ${opened.revision.number} stays as it is; results pinned to it do not change.`}</Small>
      )}
      <StatusLine message={said} />
    </Sheet>
  );
}

/** Nothing to keep: an empty new wall, or the very revision that is open. */
function isUntouched(spec: LaminateSpec, opened: KeptLaminate | null): boolean {
  if (opened === null) return spec.layers.length === 0 && spec.name === '';
  return (
    JSON.stringify([spec.name, spec.layers]) ===
    JSON.stringify([opened.revision.spec.name, opened.revision.spec.layers])
  );
}

function suggestedNameOf(
  wall: WallDraft,
  book: MaterialBook,
  unitSystem: ReturnType<typeof useUnitSystem>,
): string {
  const named = wall.layers.flatMap((layer) => {
    const material = book.revisionOf(layer)?.spec;
    return material === undefined ? [] : [{ material, thicknessUm: gaugeUm(layer.gauge) }];
  });
  return suggestedName(named, unitSystem);
}

interface TitleBlockContext {
  book: MaterialBook;
  unitSystem: ReturnType<typeof useUnitSystem>;
}

function titleBlockCells(
  wall: WallDraft,
  opened: KeptLaminate | null,
  { book, unitSystem }: TitleBlockContext,
) {
  const gauges = wall.layers.map((layer) => gaugeUm(layer.gauge));
  const weak = wall.layers.filter((layer) => {
    const material = book.revisionOf(layer)?.spec;
    return material !== undefined && weakGroundOf(material).length > 0;
  }).length;
  return [
    { label: 'revision', value: opened === null ? 'not saved yet' : String(opened.revision.number) },
    { label: 'layers', value: String(wall.layers.length) },
    { label: 'in all', value: gauges.every(Number.isFinite) ? totalGauge(gauges, unitSystem) : '–' },
    {
      label: 'partly from memory, invented or common practice',
      value: `${weak} of ${wall.layers.length} layers`,
    },
  ];
}
