import { useFormikContext } from 'formik';
import { useState } from 'react';
import { View } from 'react-native';
import type { MaterialBook } from '../material-book';
import type { BuiltLayer } from '../built-layer';
import type { WallPreview } from '../wall-preview';
import { Button, Inline, Notice, Sheet, Small, SPACE, StatusLine } from '../../../ui';
import {
  gaugeUm,
  type ChosenMaterial,
  type DraftGauge,
  type DraftLayer,
  type WallDraft,
  type WallEvent,
} from '../wall-draft';
import type { WallEdits } from '../use-wall-edits';
import { keepFocusInRow } from './keep-focus-in-row';
import { LayerRow, layerRowId } from './layer-row';
import { MaterialPicker } from './material-picker';
import { shareFigures } from './share-figures';

export interface LayerListProps {
  edits: WallEdits;
  book: MaterialBook;
  layers: BuiltLayer[] | null;
  preview: WallPreview | null;
  newMaterialHref: string;
  /** A material just made for this wall: the picker opens on it. */
  searchAtFirst: string;
}

type Picking = { for: 'new' } | { for: 'change'; layer: DraftLayer } | null;

/** The layers from the outside face to the inside face, and everything that changes them. */
export function LayerList({ edits, book, layers, preview, newMaterialHref, searchAtFirst }: LayerListProps) {
  const { wall, happened } = edits;
  const formik = useFormikContext<WallDraft>();
  const [picking, setPicking] = useState<Picking>(searchAtFirst === '' ? null : { for: 'new' });
  const [said, setSaid] = useState('');
  const nameOf = (layer: DraftLayer | undefined) =>
    layer === undefined ? 'The layer' : (book.revisionOf(layer)?.spec.name ?? 'The layer');

  const onEvent = (event: WallEvent) => {
    happened(event);
    if (event.type === 'layer_moved') {
      keepFocusInRow(layerRowId(event.key));
      const index = wall.layers.findIndex((layer) => layer.key === event.key);
      const to = Math.min(Math.max(index + event.by, 0), wall.layers.length - 1);
      setSaid(`${nameOf(wall.layers[index])} is now layer ${to + 1} of ${wall.layers.length}.`);
    }
    if (event.type === 'layer_removed') {
      setSaid(`${nameOf(wall.layers.find((layer) => layer.key === event.key))} is out. Undo brings it back.`);
    }
    if (event.type === 'layer_duplicated') setSaid('Duplicated, just inside the first.');
    if (event.type === 'turned_round') setSaid('Turned round: what was inside is now outside.');
  };

  const onChosen = (material: ChosenMaterial, gauge: DraftGauge) => {
    if (picking?.for === 'change') {
      const isFilm =
        book.materials.find((each) => each.id === material.material_id)?.revision.spec.kind === 'film';
      const keepsGauge = isFilm && Number.isFinite(gaugeUm(picking.layer.gauge));
      onEvent({
        type: 'material_changed',
        key: picking.layer.key,
        material,
        // The gauge pressed is the gauge meant.
        gauge: keepsGauge && gauge.text === picking.layer.gauge.text ? picking.layer.gauge : gauge,
      });
    } else {
      onEvent({ type: 'layer_added', material, gauge });
    }
    setPicking(null);
  };

  const listFault = typeof formik.errors.layers === 'string' ? formik.errors.layers : undefined;
  const isListFaultShown = formik.submitCount > 0 || wall.layers.length > 0;
  return (
    <Sheet
      title="Layers"
      subtitle="From outside air at the top to the food at the bottom."
      action={
        <View style={{ flexDirection: 'row' }}>
          <Button
            label="Undo"
            kind="quiet"
            isDisabled={!edits.canUndo}
            onPress={() => happened({ type: 'undone' })}
          />
          <Button
            label="Redo"
            kind="quiet"
            isDisabled={!edits.canRedo}
            onPress={() => happened({ type: 'redone' })}
          />
        </View>
      }
    >
      {wall.layers.length === 0 ? <Small>No layer yet. Begin with the outside face.</Small> : null}
      <View role="list" aria-label="Layers, outside first; Alt with the arrow keys moves one">
        {wall.layers.map((layer, index) => (
          <LayerRow
            key={layer.key}
            layer={layer}
            index={index}
            count={wall.layers.length}
            material={book.revisionOf(layer)?.spec}
            shares={sharesOf(preview, layers, index)}
            newerRevision={book.newerThan(layer)?.number}
            onEvent={onEvent}
            onFieldLeft={() => happened({ type: 'field_left' })}
            onChangeMaterial={() => setPicking({ for: 'change', layer })}
            onTakeNewerRevision={() => {
              const newer = book.newerThan(layer);
              if (newer === undefined) return;
              const material = { material_id: layer.material_id, material_revision_id: newer.id };
              onEvent({ type: 'material_changed', key: layer.key, material });
            }}
          />
        ))}
      </View>
      <View style={{ gap: SPACE.x2 }}>
        {isListFaultShown && listFault !== undefined ? <Notice kind="error">{listFault}</Notice> : null}
        <Inline>
          <Button label="Add a layer" icon="add" onPress={() => setPicking({ for: 'new' })} />
          <Button
            label="Turn round"
            icon="turn-round"
            isDisabled={wall.layers.length < 2}
            onPress={() => onEvent({ type: 'turned_round' })}
          />
        </Inline>
        <StatusLine message={said} />
      </View>
      {picking === null ? null : (
        <MaterialPicker
          title={picking.for === 'new' ? 'Add a layer' : `Instead of ${nameOf(picking.layer)}`}
          materials={book.materials}
          newMaterialHref={newMaterialHref}
          searchAtFirst={picking.for === 'new' ? searchAtFirst : ''}
          isOpen
          onChosen={onChosen}
          onClose={() => setPicking(null)}
        />
      )}
    </Sheet>
  );
}

function sharesOf(preview: WallPreview | null, layers: BuiltLayer[] | null, index: number) {
  if (preview === null || layers === null) return null;
  return {
    oxygen: `${shareFigures(preview.chosen.oxygen.resistance_share[index] ?? 0)} %`,
    water: `${shareFigures(preview.chosen.water.resistance_share[index] ?? 0)} %`,
  };
}
