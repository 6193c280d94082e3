import { useState } from 'react';
import { ChartWithTable } from '../../../charts/chart-with-table';
import { PressureStairs } from '../../../charts/pressure-stairs';
import { SectionDrawing } from '../../../charts/section-drawing';
import { ShareBars } from '../../../charts/share-bars';
import { formatNumber, formatQuantity, type DisplayUnitSystem } from '../../../../shared/units/format';
import type { WallState } from '../../../../shared/engine';
import { useUnitSystem } from '../../../session';
import { Notice, Sheet, Small, Stack } from '../../../ui';
import type { BuiltLayer } from '../built-layer';
import type { SidesText } from '../sides-text';
import type { WallPreview } from '../wall-preview';
import { wallWarnings } from '../wall-warnings';
import { shareFigures } from './share-figures';
import { SidesFields } from './sides-fields';
import { TestAnswers } from './test-answers';
import { TurnedRound } from './turned-round-sheet';

export interface WallViewProps {
  name: string;
  /** Null while a gauge is no number or a material is on its way. */
  layers: BuiltLayer[] | null;
  /** Null while a condition is no number either. */
  preview: WallPreview | null;
  sides: SidesText;
  onSidesChange: (sides: SidesText) => void;
}

/** The wall drawn, and what it answers while it is being changed. */
export function WallView({ name, layers, preview, sides, onSidesChange }: WallViewProps) {
  const unitSystem = useUnitSystem();
  const [selectedIndex, setSelectedIndex] = useState<number | undefined>(undefined);
  if (layers !== null && layers.length === 0) {
    return (
      <Sheet title="The wall">
        <Small>Add the first layer and the wall is drawn here, with what it lets through.</Small>
      </Sheet>
    );
  }
  const selected =
    selectedIndex !== undefined && selectedIndex < (layers?.length ?? 0) ? selectedIndex : undefined;
  return (
    <Stack gap="x4">
      <Sheet title="The wall" subtitle="Preview, worked out on this device as you change it.">
        {layers === null ? (
          <Small>The drawing comes as soon as every gauge is a number that fits.</Small>
        ) : (
          <SectionDrawing
            name={name === '' ? 'Wall' : name}
            sentence={sectionSentence(layers)}
            layers={layers.map((layer) => layer.drawn)}
            selectedIndex={selected}
            onSelect={setSelectedIndex}
          />
        )}
        <SidesFields text={sides} onChange={onSidesChange} />
        {preview === null ? (
          <Small>The answer comes as soon as every gauge and condition is a number that fits.</Small>
        ) : (
          <TestAnswers preview={preview} />
        )}
      </Sheet>
      {layers === null || preview === null ? null : (
        <>
          <Warnings layers={layers} state={preview.chosen} unitSystem={unitSystem} />
          <Sheet
            title="Who holds what"
            subtitle="Share of the resistance to each gas, under the conditions above."
          >
            <ShareBars
              rows={shareRows(layers, preview.chosen)}
              selectedIndex={selected}
              onSelect={setSelectedIndex}
            />
          </Sheet>
          <Sheet title="Through the wall">
            <Stairs name={name} layers={layers} state={preview.chosen} selectedIndex={selected} />
          </Sheet>
          <TurnedRound layers={layers} temperature_C={preview.chosen.temperature_C} />
        </>
      )}
    </Stack>
  );
}

function sectionSentence(layers: BuiltLayer[]): string {
  const words = layers.map(({ drawn }) => `${drawn.name} ${drawn.gaugeLabel}`).join(', ');
  return `From outside air to headspace: ${words}.`;
}

function Warnings({
  layers,
  state,
  unitSystem,
}: {
  layers: BuiltLayer[];
  state: WallState;
  unitSystem: DisplayUnitSystem;
}) {
  const warnings = wallWarnings(
    layers.map((layer) => layer.description),
    state,
    unitSystem,
  );
  if (warnings.length === 0) return null;
  return (
    <Notice kind="caution" title="This answer leans on more than was measured">
      <Stack gap="x1">
        {warnings.map((warning) => (
          <Small key={warning} tone="ink">
            {warning}
          </Small>
        ))}
      </Stack>
    </Notice>
  );
}

function shareRows(layers: BuiltLayer[], state: WallState) {
  return layers.map(({ drawn }, index) => {
    const oxygenShare = state.oxygen.resistance_share[index] ?? 0;
    const waterShare = state.water.resistance_share[index] ?? 0;
    return {
      layer: drawn,
      oxygenShare,
      waterShare,
      oxygenFigures: shareFigures(oxygenShare),
      waterFigures: shareFigures(waterShare),
    };
  });
}

interface StairsProps {
  name: string;
  layers: BuiltLayer[];
  state: WallState;
  selectedIndex: number | undefined;
}

function Stairs({ name, layers, state, selectedIndex }: StairsProps) {
  const unitSystem = useUnitSystem();
  const pressure = (pa: number) => formatQuantity(pa, 'pressure_Pa', { unitSystem });
  const humidity = (fraction: number) =>
    formatQuantity(fraction, 'fraction_as_percent', { unitSystem, isExact: true }).text;
  const oxygen = state.oxygen.interface_pressure_Pa;
  const water = state.water.interface_pressure_Pa;
  const { unit } = pressure(1000);
  const ends = (pressures: number[]) => ({
    outsideFigures: pressure(pressures[0] ?? 0).figures,
    insideFigures: pressure(pressures.at(-1) ?? 0).figures,
  });
  const faceNames = [
    'outside face',
    ...layers.slice(1).map(({ drawn }, index) => `${layers[index]?.drawn.name ?? ''} to ${drawn.name}`),
    'inside face',
  ];
  return (
    <ChartWithTable
      table={{
        caption: 'Partial pressures and humidity at each face, outside first',
        columns: [
          { key: 'face', title: 'Face' },
          { key: 'oxygen', title: 'Oxygen', unit, kind: 'figure' },
          { key: 'water', title: 'Water', unit, kind: 'figure' },
          { key: 'humidity', title: 'Humidity', unit: '%', kind: 'figure' },
        ],
        rows: faceNames.map((face, index) => ({
          id: String(index),
          face,
          oxygen: pressure(oxygen[index] ?? 0).figures,
          water: pressure(water[index] ?? 0).figures,
          humidity: formatNumber(100 * (state.water.interface_relative_humidity[index] ?? 0)),
        })),
      }}
    >
      <PressureStairs
        name={`Pressures through ${name === '' ? 'the wall' : name}`}
        sentence="Oxygen and water partial pressure, from the air outside to the headspace; the figures are in the table."
        stamp={{
          title: 'Under the chosen conditions, air outside, no oxygen inside',
          detail: `${formatQuantity(state.temperature_C, 'temperature_C', { unitSystem, isExact: true }).text}, ${humidity(state.relative_humidity_outside)} outside, ${humidity(state.relative_humidity_inside)} inside`,
        }}
        layers={layers.map((layer) => layer.drawn)}
        series={[
          { gas: 'oxygen', interfacePressurePa: oxygen, unit, ...ends(oxygen) },
          { gas: 'water', interfacePressurePa: water, unit, ...ends(water) },
        ]}
        selectedIndex={selectedIndex}
      />
    </ChartWithTable>
  );
}
