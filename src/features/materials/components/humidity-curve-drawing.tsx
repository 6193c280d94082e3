import Svg, { Circle, Line, Path } from 'react-native-svg';
import { formatNumber } from '../../../../shared/units/format';
import { ChartFrame } from '../../../charts/chart-frame';
import { ChartText } from '../../../charts/chart-text';
import { ChartWithTable } from '../../../charts/chart-with-table';
import { useTheme } from '../../../ui';
import { valuesFromFactors, type CurvePoint } from '../humidity-curve-values';
import { unitInPrint, type Gas } from '../unit-choice';

export interface HumidityCurveDrawingProps {
  gas: Gas;
  points: CurvePoint[];
  stated: { value: number; relative_humidity: number; unit: string };
}

const HEIGHT_PX = 140;
const LEFT_PX = 52;
const TOP_PX = 22;
const BOTTOM_PX = 26;

/** The value over humidity, its axis in powers of ten; measured points marked, what is held beyond them broken. */
export function HumidityCurveDrawing({ gas, points, stated }: HumidityCurveDrawingProps) {
  const values = valuesFromFactors(points, stated);
  const unit = unitInPrint(stated.unit);
  const first = values[0];
  const last = values.at(-1);
  if (first === undefined || last === undefined) return null;
  return (
    <ChartWithTable
      label="Table behind this curve"
      table={{
        caption: `${gas === 'oxygen' ? 'Oxygen' : 'Water vapour'} at each humidity of the curve`,
        columns: [
          { key: 'humidity', title: 'Humidity', unit: '%', kind: 'figure' },
          { key: 'value', title: 'Value', unit, kind: 'figure' },
          { key: 'factor', title: 'Factor', kind: 'figure' },
        ],
        rows: values.map((point, index) => ({
          id: String(index),
          humidity: formatNumber(point.relative_humidity * 100),
          value: formatNumber(point.value),
          factor: formatNumber(points[index]?.factor ?? NaN),
        })),
      }}
    >
      <ChartFrame
        name={`${gas} over humidity`}
        sentence={`From ${formatNumber(first.value)} at ${formatNumber(first.relative_humidity * 100)} % to ${formatNumber(last.value)} ${unit} at ${formatNumber(last.relative_humidity * 100)} %.`}
      >
        {(width) => <Curve gas={gas} values={values} unit={unit} width={width} />}
      </ChartFrame>
    </ChartWithTable>
  );
}

interface CurveProps {
  gas: Gas;
  values: { relative_humidity: number; value: number }[];
  unit: string;
  width: number;
}

function Curve({ gas, values, unit, width }: CurveProps) {
  const { colors } = useTheme();
  const logs = values.map((point) => Math.log10(point.value));
  const least = Math.floor(Math.min(...logs) + 1e-9);
  const most = Math.max(least + 1, Math.ceil(Math.max(...logs) - 1e-9));
  const toX = (humidity: number) => LEFT_PX + (width - LEFT_PX - 14) * humidity;
  const toY = (log: number) =>
    TOP_PX + (HEIGHT_PX - TOP_PX - BOTTOM_PX) * (1 - (log - least) / (most - least));
  const placed = values.map((point, index) => ({
    x: toX(point.relative_humidity),
    y: toY(logs[index] ?? least),
  }));
  const line = placed
    .map((at, index) => `${index === 0 ? 'M' : 'L'}${at.x.toFixed(1)} ${at.y.toFixed(1)}`)
    .join('');
  const first = placed[0];
  const last = placed.at(-1);
  const ink = gas === 'oxygen' ? colors.oxygen : colors.water;
  const powers = Array.from({ length: most - least + 1 }, (_, index) => least + index);
  return (
    <Svg width={width} height={HEIGHT_PX} aria-hidden>
      {powers.map((power) => (
        <Line
          key={power}
          x1={LEFT_PX}
          x2={width - 14}
          y1={toY(power)}
          y2={toY(power)}
          stroke={colors.lineFaint}
        />
      ))}
      {powers.map((power) => (
        <ChartText key={power} x={LEFT_PX - 6} y={toY(power) + 4} anchor="end">
          {formatNumber(10 ** power, 1)}
        </ChartText>
      ))}
      <Line x1={LEFT_PX} x2={width - 14} y1={toY(least)} y2={toY(least)} stroke={colors.inkSecond} />
      {first === undefined || last === undefined ? null : (
        <Path
          d={`M${toX(0)} ${first.y}L${first.x} ${first.y}M${last.x} ${last.y}L${toX(1)} ${last.y}`}
          stroke={ink}
          strokeWidth={1.4}
          strokeDasharray="4 3"
          fill="none"
        />
      )}
      <Path d={line} stroke={ink} strokeWidth={2} fill="none" />
      {placed.map((at, index) => (
        <Circle key={index} cx={at.x} cy={at.y} r={3.5} fill={colors.sheet} stroke={ink} strokeWidth={2} />
      ))}
      {[0, 0.5, 1].map((humidity) => (
        <ChartText
          key={humidity}
          x={toX(humidity)}
          y={HEIGHT_PX - 9}
          anchor={humidity === 1 ? 'end' : 'middle'}
        >
          {`${humidity * 100} %`}
        </ChartText>
      ))}
      <ChartText x={LEFT_PX} y={12} font="regular" tone={gas}>
        {unit}
      </ChartText>
    </Svg>
  );
}
