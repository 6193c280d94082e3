import { Pressable, View } from 'react-native';
import Svg, { Rect } from 'react-native-svg';
import { Body, Figure, HAIRLINE_PX, ROW_MIN_PX, SPACE, Small, useTheme } from '../ui';
import { shareBarWidth } from '../../shared/charts/share-bars';
import { ChartFrame } from './chart-frame';
import { HatchSwatch } from './mini-section';
import type { DrawnLayer } from './section-geometry';

export interface ShareRow {
  layer: DrawnLayer;
  oxygenShare: number;
  waterShare: number;
  oxygenFigures: string;
  waterFigures: string;
}

export interface ShareBarsProps {
  rows: ShareRow[];
  selectedIndex?: number;
  onSelect?: (index: number) => void;
}

/** Who holds what: per layer its share of the wall's resistance to each gas. */
export function ShareBars({ rows, selectedIndex, onSelect }: ShareBarsProps) {
  return (
    <View role="list" aria-label="Shares of the resistance, outside layer first">
      {rows.map((row, index) => (
        <View key={index} role="listitem">
          <ShareRowView
            row={row}
            index={index}
            isSelected={index === selectedIndex}
            onPress={onSelect === undefined ? undefined : () => onSelect(index)}
          />
        </View>
      ))}
    </View>
  );
}

interface ShareRowViewProps {
  row: ShareRow;
  index: number;
  isSelected: boolean;
  onPress: (() => void) | undefined;
}

function ShareRowView({ row, index, isSelected, onPress }: ShareRowViewProps) {
  const { colors } = useTheme();
  const { layer } = row;
  const content = (
    <>
      <View style={{ flexDirection: 'row', alignItems: 'center', gap: SPACE.x2 }}>
        <Figure value={String(index + 1)} size="small" tone="second" />
        <HatchSwatch layer={layer} />
        <View style={{ flexShrink: 1, flexGrow: 1, minWidth: 0 }}>
          <Body weight={isSelected ? 'semibold' : 'medium'}>{layer.name}</Body>
        </View>
        <Figure value={layer.gaugeLabel} size="small" tone="second" />
      </View>
      <ShareBar gas="oxygen" share={row.oxygenShare} figures={row.oxygenFigures} layerName={layer.name} />
      <ShareBar gas="water" share={row.waterShare} figures={row.waterFigures} layerName={layer.name} />
    </>
  );
  const style = {
    minHeight: ROW_MIN_PX,
    gap: SPACE.x1,
    paddingVertical: SPACE.x2,
    paddingLeft: SPACE.x2,
    borderBottomWidth: HAIRLINE_PX,
    borderBottomColor: colors.lineFaint,
    borderLeftWidth: 3,
    borderLeftColor: isSelected ? colors.ink : 'transparent',
  };
  if (onPress === undefined) return <View style={style}>{content}</View>;
  return (
    <Pressable role="button" aria-pressed={isSelected} onPress={onPress} style={style}>
      {content}
    </Pressable>
  );
}

interface ShareBarProps {
  gas: 'oxygen' | 'water';
  share: number;
  figures: string;
  layerName: string;
}

function ShareBar({ gas, share, figures, layerName }: ShareBarProps) {
  const { colors } = useTheme();
  const ink = gas === 'oxygen' ? colors.oxygen : colors.water;
  const tint = gas === 'oxygen' ? colors.oxygenTint : colors.waterTint;
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center', gap: SPACE.x2 }}>
      <View style={{ width: 50 }}>
        <Small tone={gas}>{gas}</Small>
      </View>
      <View style={{ flexGrow: 1, flexShrink: 1, minWidth: 0 }}>
        <ChartFrame name={`${layerName}, ${gas}`} sentence={`${figures} % of the resistance.`}>
          {(width) => (
            <Svg width={width} height={8} aria-hidden>
              <Rect x={0} y={0} width={width} height={8} fill={tint} />
              <Rect x={0} y={0} width={shareBarWidth(share, width)} height={8} fill={ink} />
            </Svg>
          )}
        </ChartFrame>
      </View>
      <View style={{ width: 64, alignItems: 'flex-end' }}>
        <Figure value={figures} unit="%" size="small" />
      </View>
    </View>
  );
}
