import { View } from 'react-native';
import type { MaterialSpec, StatedValue } from '../../../../shared/contract/materials';
import { formatExact, formatQuantity, type DisplayUnitSystem } from '../../../../shared/units/format';
import { provenanceFieldInWords, provenanceInWords } from '../../../api/kept-forms/provenance-words';
import { useUnitSystem } from '../../../session';
import { DataTable, Disclosure, Figure, Sheet, Small, SPACE } from '../../../ui';
import { conditionsInWords } from '../conditions-in-words';
import { curvePoints } from '../gas-form-values';
import { GAS_TITLES } from '../material-field-labels';
import { shownCoefficient } from '../si-words';
import { unitInPrint, type Gas } from '../unit-choice';
import { HumidityCurveDrawing } from './humidity-curve-drawing';

/** What is known of a material, each number with where it comes from. */
export function MaterialFacts({ spec }: { spec: MaterialSpec }) {
  return (
    <>
      {spec.kind === 'foil' ? null : (
        <>
          <GasFacts gas="oxygen" spec={spec} />
          <GasFacts gas="water" spec={spec} />
        </>
      )}
      {spec.kind === 'film' || spec.defects === null ? null : (
        <Sheet title="Pinholes" subtitle="An estimate by nature.">
          <Small tone="ink">
            {`${formatExact(spec.defects.density_per_m2)} per m², ${formatExact(spec.defects.diameter_um)} µm across.`}
          </Small>
        </Sheet>
      )}
      <OtherFacts spec={spec} />
    </>
  );
}

function GasFacts({ gas, spec }: { gas: Gas; spec: Exclude<MaterialSpec, { kind: 'foil' }> }) {
  const unitSystem = useUnitSystem();
  const { stated, gas: block, geometric_sd } = spec[gas];
  const points = curvePoints(stated);
  const shown = shownCoefficient(gas, block, unitSystem);
  const ground = spec.provenance.find((entry) => entry.field === `${gas}.value`);
  return (
    <Sheet
      title={GAS_TITLES[gas]}
      subtitle={
        ground === undefined
          ? undefined
          : `The value is ${provenanceInWords(ground.kind)}${ground.source === '' ? '' : `: ${ground.source}`}`
      }
    >
      <View style={{ gap: SPACE.x1 }}>
        <Figure value={shown.figures} unit={shown.unit} size="title" isStrong />
        <Small>{`Stated as ${formatExact(stated.value)} ${unitInPrint(stated.unit)}, ${conditionsInWords(gas, stated, unitSystem)}.`}</Small>
        <Small>{temperatureInWords(stated, unitSystem)}</Small>
        {geometric_sd === undefined ? null : (
          <Small>{`Spread: a factor of ${formatExact(geometric_sd)} up or down.`}</Small>
        )}
      </View>
      {points.length === 0 ? (
        <Small>Humidity does not change it.</Small>
      ) : (
        <HumidityCurveDrawing
          gas={gas}
          points={points}
          stated={{
            value: stated.value,
            unit: stated.unit,
            relative_humidity: block.reference_relative_humidity ?? 0,
          }}
        />
      )}
      <Provenance spec={spec} prefix={gas} />
    </Sheet>
  );
}

function temperatureInWords(stated: StatedValue, unitSystem: DisplayUnitSystem): string {
  const energy = stated.activation_energy_J_per_mol;
  if (energy === undefined || energy === 0) return 'No activation energy: the same at every temperature.';
  const celsius = (value: number) =>
    formatQuantity(value, 'temperature_C', { unitSystem, isExact: true }).text;
  const { measured_temperature_min_C: min, measured_temperature_max_C: max } = stated;
  const range =
    min === undefined || max === undefined
      ? 'nobody says at which temperatures that holds'
      : `measured from ${celsius(min)} to ${celsius(max)}`;
  return `Activation energy ${formatQuantity(energy, 'energy_J_per_mol', { unitSystem, isExact: true }).text}; ${range}.`;
}

function Provenance({ spec, prefix }: { spec: MaterialSpec; prefix: string }) {
  const entries = spec.provenance.filter(
    (entry) => entry.field === prefix || entry.field.startsWith(`${prefix}.`),
  );
  if (entries.length === 0) return null;
  return (
    <Disclosure label="Where each number comes from">
      <ProvenanceTable entries={entries} caption={`Where the numbers for ${prefix} come from`} />
    </Disclosure>
  );
}

function ProvenanceTable({ entries, caption }: { entries: MaterialSpec['provenance']; caption: string }) {
  return (
    <DataTable
      caption={caption}
      isCaptionHidden
      columns={[
        { key: 'field', title: 'Number' },
        { key: 'kind', title: 'Ground' },
        { key: 'source', title: 'Source' },
      ]}
      rows={entries.map((entry) => ({
        id: entry.field,
        field: provenanceFieldInWords(entry.field),
        kind: provenanceInWords(entry.kind),
        source: [entry.source, entry.note].filter((text) => text !== '').join('; ') || '–',
      }))}
    />
  );
}

function OtherFacts({ spec }: { spec: MaterialSpec }) {
  const unitSystem = useUnitSystem();
  const gauges = spec.typical_gauges_um
    .map(
      (gauge) => formatQuantity(gauge, 'thickness_um', { unitSystem, isExact: unitSystem === 'metric' }).text,
    )
    .join(', ');
  const others = spec.provenance.filter((entry) => !/^(oxygen|water)\b/.test(entry.field));
  return (
    <Sheet title="Besides">
      <View style={{ gap: SPACE.x1 }}>
        <Small>{gauges === '' ? 'No usual gauges given.' : `Usual gauges: ${gauges}.`}</Small>
        {spec.density_kg_per_m3 === null ? null : (
          <Small>{`Density ${formatExact(spec.density_kg_per_m3)} kg/m³.`}</Small>
        )}
        {spec.notes === '' ? null : <Small tone="ink">{spec.notes}</Small>}
      </View>
      {others.length === 0 ? null : (
        <Disclosure label="Where these come from">
          <ProvenanceTable entries={others} caption="Where the other numbers come from" />
        </Disclosure>
      )}
    </Sheet>
  );
}
