import { View } from 'react-native';
import Svg, { Circle, G, Line, Path, Rect } from 'react-native-svg';
import { Body, SPACE, Small, useTheme } from '../ui';
import { layoutStair } from '../../shared/charts/pressure-stairs';
import { ChartFrame } from './chart-frame';
import { ChartText } from './chart-text';
import { sectionGeometry } from './section-geometry';
import type { DrawnLayer } from './section-geometry';

export interface StairSeries {
  gas: 'oxygen' | 'water';
  /** From the outside face to the inside face, one more than layers. */
  interfacePressurePa: number[];
  /** The pressures of the two sides as shown, without unit. */
  outsideFigures: string;
  insideFigures: string;
  unit: string;
}

export interface PressureStairsProps {
  name: string;
  sentence: string;
  /** When and where this holds: leg, day, temperature, humidity outside and inside. */
  stamp: { title: string; detail: string };
  layers: DrawnLayer[];
  series: StairSeries[];
  selectedIndex?: number;
}

const HEAD_PX = 34;
const STAIR_PX = 64;
const FOOT_PX = 10;

/** Both partial pressures through the wall, under the section and in line with it. */
export function PressureStairs({
  name,
  sentence,
  stamp,
  layers,
  series,
  selectedIndex,
}: PressureStairsProps) {
  const { colors } = useTheme();
  return (
    <View style={{ gap: SPACE.x2 }}>
      <View style={{ borderLeftWidth: 2, borderLeftColor: colors.ink, paddingLeft: SPACE.x2 }}>
        <Body weight="medium">{stamp.title}</Body>
        <Small>{stamp.detail}</Small>
      </View>
      <ChartFrame name={name} sentence={sentence}>
        {(width) => <Stairs layers={layers} series={series} width={width} selectedIndex={selectedIndex} />}
      </ChartFrame>
    </View>
  );
}

interface StairsProps {
  layers: DrawnLayer[];
  series: StairSeries[];
  width: number;
  selectedIndex?: number;
}

function Stairs({ layers, series, width, selectedIndex }: StairsProps) {
  const { colors } = useTheme();
  const { sectionX, sectionWidth, layout } = sectionGeometry(layers, width);
  const faces = [...layout.boxes.map((box) => sectionX + box.x), sectionX + sectionWidth];
  const height = series.length * (HEAD_PX + STAIR_PX + FOOT_PX);
  const selected = selectedIndex === undefined ? undefined : layout.boxes[selectedIndex];
  return (
    <Svg width={width} height={height} aria-hidden>
      {selected === undefined ? null : (
        <Rect
          x={sectionX + selected.x}
          y={0}
          width={selected.width}
          height={height}
          fill={colors.lineFaint}
        />
      )}
      {faces.map((x, index) => (
        <Line
          key={index}
          x1={x}
          x2={x}
          y1={HEAD_PX - 10}
          y2={height}
          stroke={colors.line}
          strokeWidth={0.75}
        />
      ))}
      {series.map((stair, index) => (
        <G key={stair.gas} transform={`translate(0 ${index * (HEAD_PX + STAIR_PX + FOOT_PX)})`}>
          <Stair
            series={stair}
            geometry={{ boxes: layout.boxes, sectionX, width }}
            selectedIndex={selectedIndex}
          />
        </G>
      ))}
    </Svg>
  );
}

interface StairProps {
  series: StairSeries;
  geometry: { boxes: { x: number; width: number }[]; sectionX: number; width: number };
  selectedIndex: number | undefined;
}

function Stair({ series, geometry, selectedIndex }: StairProps) {
  const { colors } = useTheme();
  const { boxes, sectionX, width } = geometry;
  const stair = layoutStair(series.interfacePressurePa, boxes, { sectionX, width, height: STAIR_PX });
  const ink = series.gas === 'oxygen' ? colors.oxygen : colors.water;
  const tint = series.gas === 'oxygen' ? colors.oxygenTint : colors.waterTint;
  const first = stair.points[0];
  const last = stair.points.at(-1);
  // points[0] is the left edge of the drawing; the faces follow.
  const marked = selectedIndex === undefined ? [] : stair.points.slice(selectedIndex + 1, selectedIndex + 3);
  return (
    <>
      <ChartText x={width / 2} y={12} anchor="middle" font="semibold" tone={series.gas} sizePx={12.5}>
        {`${series.gas}, ${series.unit}`}
      </ChartText>
      <G transform={`translate(0 ${HEAD_PX})`}>
        <Path d={stair.area} fill={tint} fillOpacity={0.75} />
        <Line x1={0} x2={width} y1={stair.baseY} y2={stair.baseY} stroke={colors.inkSecond} strokeWidth={1} />
        <Path
          d={stair.line}
          stroke={ink}
          strokeWidth={2}
          fill="none"
          strokeDasharray={series.gas === 'water' ? '7 2' : undefined}
        />
        {marked.map((point, index) => (
          <Circle
            key={index}
            cx={point.x}
            cy={point.y}
            r={3.5}
            fill={colors.sheet}
            stroke={ink}
            strokeWidth={2}
          />
        ))}
        {first === undefined ? null : (
          <ChartText x={2} y={first.y - 5} tone="ink">
            {series.outsideFigures}
          </ChartText>
        )}
        {last === undefined ? null : (
          <ChartText x={width - 2} y={last.y - 5} anchor="end" tone="ink">
            {series.insideFigures}
          </ChartText>
        )}
      </G>
    </>
  );
}
