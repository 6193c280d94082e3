import Svg, { G, Line, Rect } from 'react-native-svg';
import type { PouchForm } from '../../../../shared/contract/packs';
import { formatQuantity } from '../../../../shared/units/format';
import { ChartFrame } from '../../../charts/chart-frame';
import { ChartText } from '../../../charts/chart-text';
import { useUnitSystem } from '../../../session';
import { useTheme } from '../../../ui';

const HEIGHT_PX = 210;
const MARGIN_PX = 36;

/** The pouch lying flat, to scale: outline, seals in tint, and its dimensions. */
export function PouchDrawing({ pouch }: { pouch: PouchForm }) {
  const unitSystem = useUnitSystem();
  const length = (mm: number) =>
    formatQuantity(mm, 'length_mm', { unitSystem, isExact: unitSystem === 'metric' }).text;
  const gusset = pouch.gusset_depth_mm > 0 ? `, gusset folded ${length(pouch.gusset_depth_mm)} deep` : '';
  return (
    <ChartFrame
      name="Pouch lying flat"
      sentence={`${length(pouch.width_mm)} wide, ${length(pouch.height_mm)} high; seals ${length(pouch.seal_left_mm)} left, ${length(pouch.seal_right_mm)} right, ${length(pouch.seal_top_mm)} top, ${length(pouch.seal_bottom_mm)} bottom${gusset}.`}
    >
      {(width) => <Outline pouch={pouch} width={width} length={length} />}
    </ChartFrame>
  );
}

interface OutlineProps {
  pouch: PouchForm;
  width: number;
  length: (mm: number) => string;
}

function Outline({ pouch, width, length }: OutlineProps) {
  const { colors } = useTheme();
  const roomX = width - 2 * MARGIN_PX - 40;
  const roomY = HEIGHT_PX - 2 * MARGIN_PX;
  const scale = Math.min(roomX / pouch.width_mm, roomY / pouch.height_mm);
  const drawnWidth = pouch.width_mm * scale;
  const drawnHeight = pouch.height_mm * scale;
  const left = (width - drawnWidth) / 2 - 20;
  const top = MARGIN_PX;
  const right = left + drawnWidth;
  const bottom = top + drawnHeight;
  const inner = {
    x: left + pouch.seal_left_mm * scale,
    y: top + pouch.seal_top_mm * scale,
    width: Math.max(0, drawnWidth - (pouch.seal_left_mm + pouch.seal_right_mm) * scale),
    height: Math.max(0, drawnHeight - (pouch.seal_top_mm + pouch.seal_bottom_mm) * scale),
  };
  const gussetY = inner.y + inner.height - Math.min(pouch.gusset_depth_mm * scale, inner.height);
  const ink = { stroke: colors.inkSecond, strokeWidth: 1 };
  return (
    <Svg width={width} height={HEIGHT_PX} aria-hidden>
      <Rect
        x={left}
        y={top}
        width={drawnWidth}
        height={drawnHeight}
        fill={colors.line}
        stroke={colors.ink}
        strokeWidth={1.2}
      />
      <Rect {...inner} fill={colors.sheet} stroke={colors.inkSecond} strokeWidth={0.8} />
      {pouch.gusset_depth_mm > 0 ? (
        <G>
          <Line
            x1={inner.x}
            x2={inner.x + inner.width}
            y1={gussetY}
            y2={gussetY}
            stroke={colors.ink}
            strokeDasharray="5 4"
          />
          <ChartText x={inner.x + inner.width / 2} y={gussetY - 5} anchor="middle">
            {`gusset ${length(pouch.gusset_depth_mm)}`}
          </ChartText>
        </G>
      ) : null}
      <Line x1={left} x2={right} y1={top - 12} y2={top - 12} {...ink} />
      <Line x1={left} x2={left} y1={top - 17} y2={top - 2} {...ink} />
      <Line x1={right} x2={right} y1={top - 17} y2={top - 2} {...ink} />
      <ChartText x={(left + right) / 2} y={top - 18} anchor="middle" tone="ink">
        {length(pouch.width_mm)}
      </ChartText>
      <Line x1={right + 12} x2={right + 12} y1={top} y2={bottom} {...ink} />
      <Line x1={right + 2} x2={right + 17} y1={top} y2={top} {...ink} />
      <Line x1={right + 2} x2={right + 17} y1={bottom} y2={bottom} {...ink} />
      <ChartText x={right + 20} y={(top + bottom) / 2 + 4} tone="ink">
        {length(pouch.height_mm)}
      </ChartText>
      <ChartText x={(left + right) / 2} y={bottom + 18} anchor="middle" font="regular">
        seals shaded
      </ChartText>
    </Svg>
  );
}
