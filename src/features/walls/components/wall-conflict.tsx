import { formatQuantity } from '../../../../shared/units/format';
import type { LaminateSpec } from '../../../../shared/contract/laminates';
import type { KeptLaminate } from '../../../api/kept-things-queries';
import { useUnitSystem } from '../../../session';
import { Button, ConflictNotice, DataTable, Small, Stack } from '../../../ui';
import type { MaterialBook } from '../material-book';

export interface WallConflictProps {
  mine: LaminateSpec;
  theirs: KeptLaminate;
  book: MaterialBook;
  isBusy: boolean;
  onKeepMine: () => void;
  onTakeTheirs: () => void;
  onSaveAsNew: () => void;
}

/** Both walls side by side, layer by layer; nothing is lost until one of the three is chosen. */
export function WallConflict({ mine, theirs, book, isBusy, ...choices }: WallConflictProps) {
  const unitSystem = useUnitSystem();
  const layerWords = (layer: LaminateSpec['layers'][number] | undefined) => {
    if (layer === undefined) return '–';
    const name =
      book.revisionOf(layer)?.spec.name ??
      book.materials.find((each) => each.id === layer.material_id)?.revision.spec.name;
    const gauge = Number.isFinite(layer.thickness_um)
      ? formatQuantity(layer.thickness_um, 'thickness_um', { unitSystem, isExact: unitSystem === 'metric' })
          .text
      : 'no gauge yet';
    return `${name ?? 'Material'}, ${gauge}`;
  };
  const spec = theirs.revision.spec;
  const count = Math.max(mine.layers.length, spec.layers.length);
  const rows = Array.from({ length: count }, (_, index) => ({
    id: String(index),
    layer: String(index + 1),
    mine: layerWords(mine.layers[index]),
    theirs: layerWords(spec.layers[index]),
  }));
  return (
    <ConflictNotice
      what="This wall"
      onKeepMine={choices.onKeepMine}
      onTakeTheirs={choices.onTakeTheirs}
      isBusy={isBusy}
    >
      <Stack gap="x2">
        {mine.name === spec.name ? null : (
          <Small tone="ink">{`Mine is called “${mine.name}”, theirs “${spec.name}”.`}</Small>
        )}
        <DataTable
          caption={`Layers from the outside: mine and revision ${theirs.revision.number}`}
          columns={[
            { key: 'layer', title: 'Layer' },
            { key: 'mine', title: 'Mine' },
            { key: 'theirs', title: 'Theirs' },
          ]}
          rows={rows}
        />
        <Button label="Save mine as a new wall" onPress={choices.onSaveAsNew} isDisabled={isBusy} />
      </Stack>
    </ConflictNotice>
  );
}
