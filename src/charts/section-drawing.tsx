import { useId } from 'react';
import type { KeyboardEvent } from 'react';
import { Pressable, View } from 'react-native';
import Svg, { G, Line, Path, Rect } from 'react-native-svg';
import { Small, useTheme } from '../ui';
import { breakMark } from '../../shared/charts/section-layout';
import type { SectionLayerBox } from '../../shared/charts/section-layout';
import { ChartFrame } from './chart-frame';
import { ChartText, monoWidth } from './chart-text';
import { HatchedRect } from './hatched-rect';
import { layerHatch, sectionGeometry } from './section-geometry';
import type { DrawnLayer, SectionGeometry } from './section-geometry';

const LANE_PX = 15;
const DIMENSION_PX = 14;
const SECTION_PX = 96;
const INDEX_PX = 18;

export interface SectionDrawingProps {
  name: string;
  sentence: string;
  layers: DrawnLayer[];
  selectedIndex?: number;
  onSelect?: (index: number) => void;
}

/** The wall cut through: outside air left, headspace right, every layer hatched and dimensioned. */
export function SectionDrawing({ name, sentence, layers, selectedIndex, onSelect }: SectionDrawingProps) {
  const captionOf = (width: number) => sectionCaption(sectionGeometry(layers, width));
  return (
    <ChartFrame
      name={name}
      sentence={sentence}
      overlay={(width) => (
        <>
          {onSelect === undefined ? null : (
            <LayerTargets
              layers={layers}
              geometry={sectionGeometry(layers, width)}
              selectedIndex={selectedIndex}
              onSelect={onSelect}
            />
          )}
          <Small tone="third">{captionOf(width)}</Small>
        </>
      )}
    >
      {(width) => <Section layers={layers} width={width} selectedIndex={selectedIndex} />}
    </ChartFrame>
  );
}

function Section({
  layers,
  width,
  selectedIndex,
}: {
  layers: DrawnLayer[];
  width: number;
  selectedIndex?: number;
}) {
  const { colors } = useTheme();
  const geometry = sectionGeometry(layers, width);
  const { sectionX, sectionWidth, layout } = geometry;
  const top = sectionTop(geometry);
  const bottom = top + SECTION_PX;
  return (
    <Svg width={width} height={bottom + INDEX_PX + 4} aria-hidden>
      <G transform={`translate(${sectionX} 0)`}>
        {layout.boxes.map((box, index) => (
          <DimensionLine key={index} box={box} top={top} />
        ))}
        {layout.boxes.map((box, index) => (
          <DimensionLabel key={index} box={box} label={layers[index]?.gaugeLabel ?? ''} top={top} />
        ))}
        {layers.map((layer, index) => {
          const box = layout.boxes[index];
          if (box === undefined) return null;
          const rect = { x: box.x, y: top, width: box.width, height: SECTION_PX };
          return (
            <G key={index}>
              <HatchedRect rect={rect} hatch={layerHatch(layer)} />
              {box.breakX === null ? null : <Break x={box.breakX} top={top} />}
              <ChartText
                x={box.x + box.width / 2}
                y={bottom + 13}
                anchor="middle"
                font={index === selectedIndex ? 'monoMedium' : 'mono'}
                tone={index === selectedIndex ? 'ink' : 'second'}
                sizePx={box.width < 12 ? 9 : 11}
              >
                {String(index + 1)}
              </ChartText>
            </G>
          );
        })}
        {selectedIndex === undefined ? null : <Selection box={layout.boxes[selectedIndex]} top={top} />}
      </G>
      <ChartText x={sectionX - 14} y={top + SECTION_PX / 2} anchor="middle" font="regular" turned={-90}>
        outside air
      </ChartText>
      <ChartText
        x={sectionX + sectionWidth + 14}
        y={top + SECTION_PX / 2}
        anchor="middle"
        font="regular"
        turned={90}
      >
        headspace
      </ChartText>
      <Line
        x1={0}
        x2={width}
        y1={bottom + INDEX_PX + 3}
        y2={bottom + INDEX_PX + 3}
        stroke={colors.lineFaint}
      />
    </Svg>
  );
}

function dimensionY(top: number): number {
  return top - DIMENSION_PX + 4;
}

function labelYOf(box: SectionLayerBox, top: number): number {
  return dimensionY(top) - 6 - box.label.lane * LANE_PX;
}

/** All lines lie under all figures: a line led out may pass another layer's figure. */
function DimensionLine({ box, top }: { box: SectionLayerBox; top: number }) {
  const { colors } = useTheme();
  const y = dimensionY(top);
  const middle = box.x + box.width / 2;
  const labelY = labelYOf(box, top);
  const isLedOut = box.label.lane > 0 || Math.abs(box.label.centre - middle) > 3;
  return (
    <G>
      <Line x1={box.x} x2={box.x + box.width} y1={y} y2={y} stroke={colors.inkSecond} strokeWidth={1} />
      <Line x1={box.x} x2={box.x} y1={y - 4} y2={top} stroke={colors.inkSecond} strokeWidth={1} />
      <Line
        x1={box.x + box.width}
        x2={box.x + box.width}
        y1={y - 4}
        y2={top}
        stroke={colors.inkSecond}
        strokeWidth={1}
      />
      {isLedOut ? (
        <Path
          d={`M${middle} ${y}L${box.label.centre} ${labelY + 3}`}
          stroke={colors.inkThird}
          strokeWidth={0.75}
          fill="none"
        />
      ) : null}
    </G>
  );
}

function DimensionLabel({ box, label, top }: { box: SectionLayerBox; label: string; top: number }) {
  const { colors } = useTheme();
  const y = labelYOf(box, top);
  const width = monoWidth(label);
  return (
    <G>
      <Rect x={box.label.centre - width / 2} y={y - 9.5} width={width} height={12} fill={colors.sheet} />
      <ChartText x={box.label.centre} y={y} anchor="middle" tone="ink">
        {label}
      </ChartText>
    </G>
  );
}

function Break({ x, top }: { x: number; top: number }) {
  const { colors } = useTheme();
  const mark = breakMark(x, top, SECTION_PX);
  return (
    <>
      <Path d={mark.area} fill={colors.sheet} />
      <Path d={mark.left} stroke={colors.ink} strokeWidth={1} fill="none" />
      <Path d={mark.right} stroke={colors.ink} strokeWidth={1} fill="none" />
    </>
  );
}

function Selection({ box, top }: { box: SectionLayerBox | undefined; top: number }) {
  const { colors } = useTheme();
  if (box === undefined) return null;
  return (
    <>
      <Rect
        x={box.x}
        y={top}
        width={box.width}
        height={SECTION_PX}
        fill="none"
        stroke={colors.ink}
        strokeWidth={2.5}
      />
      <Rect x={box.x} y={top + SECTION_PX + INDEX_PX} width={box.width} height={3} fill={colors.ink} />
    </>
  );
}

interface LayerTargetsProps {
  layers: DrawnLayer[];
  geometry: SectionGeometry;
  selectedIndex: number | undefined;
  onSelect: (index: number) => void;
}

const STEP_BY_KEY: Partial<Record<string, number>> = {
  ArrowRight: 1,
  ArrowDown: 1,
  ArrowLeft: -1,
  ArrowUp: -1,
};

/** One radio per layer over its drawing: tap it, or walk through the wall with the arrow keys. */
function LayerTargets({ layers, geometry, selectedIndex, onSelect }: LayerTargetsProps) {
  const groupId = useId();
  const top = sectionTop(geometry);
  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    const lastIndex = layers.length - 1;
    const step = STEP_BY_KEY[event.key];
    const next =
      event.key === 'Home'
        ? 0
        : event.key === 'End'
          ? lastIndex
          : step === undefined
            ? null
            : Math.min(lastIndex, Math.max(0, (selectedIndex ?? 0) + step));
    if (next === null) return;
    event.preventDefault();
    onSelect(next);
    document.getElementById(`${groupId}-${next}`)?.focus();
  };
  return (
    <View
      role="radiogroup"
      aria-label="Layers, outside first"
      onKeyDown={onKeyDown}
      style={{
        position: 'absolute',
        top,
        left: geometry.sectionX,
        width: geometry.sectionWidth,
        height: SECTION_PX,
      }}
    >
      {layers.map((layer, index) => {
        const box = geometry.layout.boxes[index];
        if (box === undefined) return null;
        const isSelected = index === selectedIndex;
        return (
          <Pressable
            key={index}
            id={`${groupId}-${index}`}
            role="radio"
            aria-checked={isSelected}
            aria-label={`${index + 1}: ${layer.name}, ${layer.gaugeLabel}`}
            tabIndex={isSelected || (selectedIndex === undefined && index === 0) ? 0 : -1}
            onPress={() => onSelect(index)}
            style={{ position: 'absolute', left: box.x, width: box.width, top: 0, height: SECTION_PX }}
          />
        );
      })}
    </View>
  );
}

function sectionTop({ layout }: SectionGeometry): number {
  return layout.laneCount * LANE_PX + DIMENSION_PX;
}

function sectionCaption({ layout }: SectionGeometry): string {
  const parts = ['Layers to scale'];
  if (layout.hasBreaks) parts.push('cut short at the break marks');
  if (layout.hasWidened) parts.push('thin ones widened to be seen');
  return `${parts.join(', ')}.`;
}
