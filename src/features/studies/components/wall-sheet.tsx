import type { Candidate } from '../../../../shared/contract/studies';
import type { WallAnswer, WallOnLeg } from '../../../../shared/engine/description/evaluation';
import { ChartWithTable, PressureStairs, SectionDrawing, ShareBars } from '../../../charts';
import { sharePercent } from '../../../../shared/charts/share-bars';
import { formatNumber } from '../../../../shared/units/format';
import { Choice, Select, Sheet, Small, Stack } from '../../../ui';
import { daysFigures } from '../answer-words';
import { drawnLayers } from '../drawn-layers';
import { useFigures, type Figures } from '../use-figures';

export interface WallSheetProps {
  candidate: Candidate;
  wall: WallAnswer;
  leg: WallOnLeg;
  /** Why the view opened on the leg it did. */
  legReason: string;
  onLegChange: (leg: number) => void;
  selectedLayer: number | undefined;
  onSelectLayer: (layer: number) => void;
}

const MOST_LEGS_IN_SIGHT = 4;

/** The wall cut through, and both gases falling through it as one leg begins. */
export function WallSheet(props: WallSheetProps) {
  const { candidate, wall, leg, legReason, onLegChange, selectedLayer, onSelectLayer } = props;
  const show = useFigures();
  const layers = drawnLayers(candidate, show);
  const stamp = legStamp(leg, show);
  const oxygenPa = leg.oxygen.interface_pressure_Pa;
  const waterPa = leg.water.interface_pressure_Pa;
  return (
    <Sheet title={candidate.name} subtitle="The wall cut through. Choose a layer to see its part.">
      <SectionDrawing
        name={`Section of ${candidate.name}`}
        sentence={`From outside air to headspace: ${layers.map((layer) => `${layer.name} ${layer.gaugeLabel}`).join(', ')}.`}
        layers={layers}
        selectedIndex={selectedLayer}
        onSelect={onSelectLayer}
      />
      {wall.legs.length > 1 ? (
        <LegPicker
          wall={wall}
          leg={leg}
          legReason={legReason}
          onLegChange={onLegChange}
          show={show}
          areAllShown={wall.legs.length >= candidate.description.route.legs.length}
        />
      ) : null}
      <ChartWithTable
        label="Table of the stairs"
        table={{
          caption: `Between the layers, ${stamp.title}, ${stamp.detail}`,
          columns: [
            { key: 'face', title: 'Face' },
            { key: 'oxygen', title: 'Oxygen', unit: show.unit('pressure_Pa'), kind: 'figure' },
            { key: 'water', title: 'Water', unit: show.unit('pressure_Pa'), kind: 'figure' },
            { key: 'humidity', title: 'Humidity', unit: '%', kind: 'figure' },
          ],
          rows: oxygenPa.map((pressure, index) => ({
            id: String(index),
            face: faceName(
              index,
              layers.map((layer) => layer.name),
            ),
            oxygen: show.figures(pressure, 'pressure_Pa'),
            water: show.figures(waterPa[index] ?? 0, 'pressure_Pa'),
            humidity: show.figures(leg.water.interface_relative_humidity[index] ?? 0, 'fraction_as_percent'),
          })),
        }}
      >
        <PressureStairs
          name="Partial pressures through the wall"
          sentence={stairSentence(leg, stamp, show)}
          stamp={stamp}
          layers={layers}
          selectedIndex={selectedLayer}
          series={[stairSeries('oxygen', oxygenPa, show), stairSeries('water', waterPa, show)]}
        />
      </ChartWithTable>
    </Sheet>
  );
}

/** Who holds what, on the leg chosen above. */
export function ShareSheet({
  candidate,
  leg,
  selectedLayer,
  onSelectLayer,
}: Omit<WallSheetProps, 'wall' | 'legReason' | 'onLegChange'>) {
  const show = useFigures();
  const layers = drawnLayers(candidate, show);
  const percentFigures = (share: number) => sharePercent(share, (value) => formatNumber(value));
  const rows = layers.map((layer, index) => {
    const oxygenShare = leg.oxygen.resistance_share[index] ?? 0;
    const waterShare = leg.water.resistance_share[index] ?? 0;
    return {
      layer,
      oxygenShare,
      waterShare,
      oxygenFigures: percentFigures(oxygenShare),
      waterFigures: percentFigures(waterShare),
    };
  });
  return (
    <Sheet title="Who holds what" subtitle={`Share of the resistance to each gas · ${legTitle(leg)}`}>
      <ChartWithTable
        label="Table of the shares"
        table={{
          caption: `Share of the wall’s resistance, ${legTitle(leg)}`,
          columns: [
            { key: 'layer', title: 'Layer' },
            { key: 'oxygen', title: 'Oxygen', unit: '%', kind: 'figure' },
            { key: 'water', title: 'Water', unit: '%', kind: 'figure' },
          ],
          rows: rows.map((row, index) => ({
            id: String(index),
            layer: `${index + 1} ${row.layer.name}`,
            oxygen: row.oxygenFigures,
            water: row.waterFigures,
          })),
        }}
      >
        <ShareBars rows={rows} selectedIndex={selectedLayer} onSelect={onSelectLayer} />
      </ChartWithTable>
    </Sheet>
  );
}

interface LegPickerProps {
  areAllShown: boolean;
  wall: WallAnswer;
  leg: WallOnLeg;
  legReason: string;
  onLegChange: (leg: number) => void;
  show: Figures;
}

function LegPicker({ wall, leg, legReason, onLegChange, show, areAllShown }: LegPickerProps) {
  const isFew = wall.legs.length <= MOST_LEGS_IN_SIGHT;
  const options = wall.legs.map((one) => ({
    value: String(one.leg),
    label: isFew
      ? `Leg ${one.leg + 1}`
      : `${legTitle(one)}, ${show.exact(one.temperature_C, 'temperature_C')}`,
  }));
  const onChange = (value: string) => onLegChange(Number(value));
  const Picker = isFew ? Choice : Select;
  return (
    <Stack gap="x1">
      <Picker label="Leg of the route" value={String(leg.leg)} onChange={onChange} options={options} />
      <Small tone="third">{legReason}</Small>
      {areAllShown ? null : <Small tone="third">Of a long route the first legs are shown.</Small>}
    </Stack>
  );
}

export function legTitle(leg: WallOnLeg): string {
  const name = leg.leg_name === undefined || leg.leg_name === '' ? '' : `: ${leg.leg_name}`;
  return `Leg ${leg.leg + 1}${name}`;
}

function legStamp(leg: WallOnLeg, show: Figures): { title: string; detail: string } {
  return {
    title: `${legTitle(leg)}, as it begins on day ${daysFigures(leg.starts_day)}`,
    detail: `${show.exact(leg.temperature_C, 'temperature_C')} · humidity ${show.exact(leg.relative_humidity_outside, 'fraction_as_percent')} outside, ${show.percent(leg.relative_humidity_inside)} inside`,
  };
}

function stairSeries(gas: 'oxygen' | 'water', pressuresPa: number[], show: Figures) {
  return {
    gas,
    interfacePressurePa: pressuresPa,
    outsideFigures: show.figures(pressuresPa[0] ?? 0, 'pressure_Pa'),
    insideFigures: show.figures(pressuresPa.at(-1) ?? 0, 'pressure_Pa'),
    unit: show.unit('pressure_Pa'),
  };
}

function stairSentence(leg: WallOnLeg, stamp: { title: string; detail: string }, show: Figures): string {
  const from = (pressures: number[]) =>
    `from ${show.text(pressures[0] ?? 0, 'pressure_Pa')} outside to ${show.text(pressures.at(-1) ?? 0, 'pressure_Pa')} inside`;
  return `${stamp.title}, ${stamp.detail}: oxygen goes ${from(leg.oxygen.interface_pressure_Pa)}, water ${from(leg.water.interface_pressure_Pa)}.`;
}

function faceName(index: number, names: string[]): string {
  const before = names[index - 1];
  const after = names[index];
  if (before === undefined) return `outside air | ${after ?? ''}`;
  return after === undefined ? `${before} | headspace` : `${before} | ${after}`;
}
