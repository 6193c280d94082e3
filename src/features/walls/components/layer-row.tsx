import type { KeyboardEvent } from 'react';
import { Pressable, View } from 'react-native';
import { HatchSwatch } from '../../../charts/mini-section';
import type { MaterialSpec } from '../../../../shared/contract/materials';
import {
  HAIRLINE_PX,
  IconButton,
  ROW_MIN_PX,
  SPACE,
  Small,
  Body,
  Stepper,
  useFieldBinding,
  useTheme,
} from '../../../ui';
import { weakGroundInWords } from '../weak-ground';
import type { DraftLayer, WallEvent } from '../wall-draft';

export interface LayerRowProps {
  layer: DraftLayer;
  index: number;
  count: number;
  /** undefined while its revision is being fetched. */
  material: MaterialSpec | undefined;
  /** '98.5 %' of the resistance to oxygen, to water; null while there is no answer. */
  shares: { oxygen: string; water: string } | null;
  /** The number of a newer revision of the material. */
  newerRevision: number | undefined;
  onEvent: (event: WallEvent) => void;
  onFieldLeft: () => void;
  onChangeMaterial: () => void;
  onTakeNewerRevision: () => void;
}

export function layerRowId(key: string): string {
  return `row-${key}`;
}

/** One layer: what it is, how thick, what it holds back, and everything that can be done with it. */
export function LayerRow(props: LayerRowProps) {
  const { layer, index, count, material, shares, onEvent } = props;
  const { colors } = useTheme();
  const name = material?.name ?? 'Fetching the material…';
  const title = `${name}, layer ${index + 1} of ${count}`;

  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    if (!event.altKey || (event.key !== 'ArrowUp' && event.key !== 'ArrowDown')) return;
    event.preventDefault();
    event.stopPropagation();
    onEvent({ type: 'layer_moved', key: layer.key, by: event.key === 'ArrowUp' ? -1 : 1 });
  };

  return (
    <View
      id={layerRowId(layer.key)}
      role="listitem"
      aria-label={title}
      onKeyDown={onKeyDown}
      style={{
        paddingVertical: SPACE.x2,
        gap: SPACE.x1,
        borderBottomWidth: HAIRLINE_PX,
        borderBottomColor: colors.lineFaint,
      }}
    >
      <View style={{ flexDirection: 'row', alignItems: 'center', gap: SPACE.x2 }}>
        <View style={{ width: 16 }}>
          <Small>{String(index + 1)}</Small>
        </View>
        <MaterialButton name={name} index={index} material={material} onPress={props.onChangeMaterial} />
        <IconButton
          icon="up"
          label={`Move ${title} outwards`}
          isDisabled={index === 0}
          onPress={() => onEvent({ type: 'layer_moved', key: layer.key, by: -1 })}
        />
        <IconButton
          icon="down"
          label={`Move ${title} inwards`}
          isDisabled={index === count - 1}
          onPress={() => onEvent({ type: 'layer_moved', key: layer.key, by: 1 })}
        />
      </View>
      <View style={{ flexDirection: 'row', alignItems: 'flex-start', justifyContent: 'space-between' }}>
        <GaugeField
          layer={layer}
          index={index}
          title={title}
          onEvent={onEvent}
          onFieldLeft={props.onFieldLeft}
        />
        <View style={{ flexDirection: 'row' }}>
          <IconButton
            icon="duplicate"
            label={`Duplicate ${title}`}
            onPress={() => onEvent({ type: 'layer_duplicated', key: layer.key })}
          />
          <IconButton
            icon="remove"
            label={`Remove ${title}`}
            onPress={() => onEvent({ type: 'layer_removed', key: layer.key })}
          />
        </View>
      </View>
      <LayerFacts {...props} shares={shares} />
    </View>
  );
}

interface MaterialButtonProps {
  name: string;
  index: number;
  material: MaterialSpec | undefined;
  onPress: () => void;
}

function MaterialButton({ name, index, material, onPress }: MaterialButtonProps) {
  return (
    <Pressable
      role="button"
      aria-label={`${name}, layer ${index + 1}: change the material`}
      onPress={onPress}
      style={{
        flexDirection: 'row',
        alignItems: 'center',
        gap: SPACE.x2,
        flexGrow: 1,
        flexShrink: 1,
        minWidth: 0,
        minHeight: ROW_MIN_PX,
      }}
    >
      {material === undefined ? null : (
        <HatchSwatch
          layer={{
            name: material.name,
            materialClass: material.material_class,
            polymerFamily: material.polymer_family,
            kind: material.kind,
          }}
        />
      )}
      <View style={{ flexShrink: 1, minWidth: 0 }}>
        <Body weight="medium">{name}</Body>
      </View>
    </Pressable>
  );
}

interface GaugeFieldProps {
  layer: DraftLayer;
  index: number;
  title: string;
  onEvent: (event: WallEvent) => void;
  onFieldLeft: () => void;
}

function GaugeField({ layer, index, title, onEvent, onFieldLeft }: GaugeFieldProps) {
  const field = useFieldBinding(`layers[${index}].gauge.text`);
  const isMetric = layer.gauge.unit === 'um';
  return (
    <View style={{ flexShrink: 1 }}>
      <Stepper
        id={field.id}
        label={`Gauge of ${title}`}
        value={layer.gauge.text}
        unit={isMetric ? 'µm' : 'mil'}
        step={{ by: isMetric ? 1 : 0.05, min: isMetric ? 0.1 : 0.005 }}
        error={field.error}
        onChange={(text) => onEvent({ type: 'gauge_typed', key: layer.key, text, unit: layer.gauge.unit })}
        onBlur={() => {
          field.onBlur();
          onFieldLeft();
        }}
      />
    </View>
  );
}

function LayerFacts({ material, shares, newerRevision, onTakeNewerRevision }: LayerRowProps) {
  const weak = material === undefined ? '' : weakGroundInWords(material);
  return (
    <View style={{ gap: SPACE.x1 }}>
      {shares === null ? null : (
        <View style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: SPACE.x3 }}>
          <Small tone="oxygen">{`oxygen ${shares.oxygen}`}</Small>
          <Small tone="water">{`water ${shares.water}`}</Small>
          <Small>of the resistance</Small>
        </View>
      )}
      {weak === '' ? null : <Small tone="third">{weak}</Small>}
      {newerRevision === undefined ? null : (
        <Pressable
          role="button"
          onPress={onTakeNewerRevision}
          style={{ minHeight: ROW_MIN_PX, justifyContent: 'center' }}
        >
          <Small tone="ink" weight="medium">{`Newer data exist: use revision ${newerRevision}`}</Small>
        </Pressable>
      )}
    </View>
  );
}
