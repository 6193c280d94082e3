import Svg, { Line, Path } from 'react-native-svg';
import { formatNumber } from '../../../../shared/units/format';
import { InputError, isothermMoisture, type IsothermDescription } from '../../../../shared/engine';
import { ChartFrame } from '../../../charts/chart-frame';
import { ChartText } from '../../../charts/chart-text';
import { ChartWithTable } from '../../../charts/chart-with-table';
import { Small, useTheme } from '../../../ui';

const LAST_ACTIVITY = 0.9;
const STEPS = 45;
const HEIGHT_PX = 150;
const LEFT_PX = 40;
const BOTTOM_PX = 28;
const TOP_PX = 12;

const ACTIVITIES = Array.from({ length: STEPS + 1 }, (_, index) => (index * LAST_ACTIVITY) / STEPS);

/** Moisture over water activity, up to 0.9. */
export function IsothermDrawing({ isotherm }: { isotherm: IsothermDescription }) {
  const moistures = moistureAt(isotherm);
  if (moistures === null) return <Small>The curve comes as soon as the isotherm has its numbers.</Small>;
  const inPercent = moistures.map((moisture) => moisture * 100);
  return (
    <ChartWithTable
      table={{
        caption: 'Moisture at each water activity',
        columns: [
          { key: 'activity', title: 'Water activity', kind: 'figure' },
          { key: 'moisture', title: 'Moisture', unit: 'g/100 g dry', kind: 'figure' },
        ],
        rows: ACTIVITIES.flatMap((activity, index) =>
          index % 5 === 0
            ? [
                {
                  id: String(index),
                  activity: formatNumber(activity),
                  moisture: formatNumber(inPercent[index] ?? NaN),
                },
              ]
            : [],
        ),
      }}
    >
      <ChartFrame
        name="Sorption isotherm"
        sentence={`Moisture over water activity: ${formatNumber(inPercent[25] ?? NaN)} g/100 g dry at 0.5, ${formatNumber(inPercent[STEPS] ?? NaN)} at 0.9.`}
      >
        {(width) => <Curve moistures={inPercent} width={width} />}
      </ChartFrame>
    </ChartWithTable>
  );
}

function moistureAt(isotherm: IsothermDescription): number[] | null {
  try {
    return isothermMoisture(isotherm, ACTIVITIES);
  } catch (error) {
    if (error instanceof InputError) return null;
    throw error;
  }
}

function Curve({ moistures, width }: { moistures: number[]; width: number }) {
  const { colors } = useTheme();
  const most = Math.max(...moistures, 1e-9);
  const least = Math.min(...moistures, 0);
  const toX = (index: number) => LEFT_PX + ((width - LEFT_PX - 12) * index) / STEPS;
  const toY = (moisture: number) =>
    TOP_PX + (HEIGHT_PX - TOP_PX - BOTTOM_PX) * (1 - (moisture - least) / (most - least));
  const line = moistures
    .map(
      (moisture, index) => `${index === 0 ? 'M' : 'L'}${toX(index).toFixed(1)} ${toY(moisture).toFixed(1)}`,
    )
    .join('');
  return (
    <Svg width={width} height={HEIGHT_PX} aria-hidden>
      <Line x1={LEFT_PX} x2={width - 12} y1={toY(least)} y2={toY(least)} stroke={colors.inkSecond} />
      <Line x1={LEFT_PX} x2={LEFT_PX} y1={TOP_PX} y2={toY(least)} stroke={colors.inkSecond} />
      <Path d={line} stroke={colors.water} strokeWidth={2} fill="none" />
      <ChartText x={LEFT_PX - 4} y={toY(most) + 4} anchor="end">
        {formatNumber(most)}
      </ChartText>
      <ChartText x={LEFT_PX - 4} y={toY(least) + 4} anchor="end">
        {formatNumber(least)}
      </ChartText>
      {[0, 0.3, 0.6, 0.9].map((activity) => (
        <ChartText
          key={activity}
          x={toX((activity / LAST_ACTIVITY) * STEPS)}
          y={HEIGHT_PX - 12}
          anchor="middle"
        >
          {String(activity)}
        </ChartText>
      ))}
      <ChartText x={LEFT_PX + 6} y={TOP_PX + 6} font="regular" tone="water">
        g/100 g dry over water activity
      </ChartText>
    </Svg>
  );
}
