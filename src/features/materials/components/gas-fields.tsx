import { useFormikContext } from 'formik';
import { PROVENANCE_KINDS } from '../../../../shared/contract/materials';
import { provenanceInWords } from '../../../api/kept-forms/provenance-words';
import { fieldUnit } from '../../../api/kept-forms/typed-quantity';
import { useUnitSystem } from '../../../session';
import { FormField, FormNumberField, FormSelect, Sheet, Small } from '../../../ui';
import { FieldGrid } from '../../../ui/field-grid';
import { computedGas, statedFrom } from '../gas-form-values';
import type { MaterialFormValues } from '../material-form-values';
import { siInWords } from '../si-words';
import { GAS_TITLES, humidityLabel, VALUE_LABELS } from '../material-field-labels';
import { isRate, needsGauge, suitableUnits, unitInPrint, type Gas, type LayerKind } from '../unit-choice';
import { CurveFields } from './curve-fields';

export interface GasFieldsProps {
  gas: Gas;
  kind: LayerKind;
  /** Only for materials that were kept without one: a new value says at which humidity it was measured. */
  isHumidityOptional: boolean;
}

/** One gas as its data sheet states it, and what it comes to in SI. */
export function GasFields({ gas, kind, isHumidityOptional }: GasFieldsProps) {
  const { values } = useFormikContext<MaterialFormValues>();
  const unitSystem = useUnitSystem();
  const celsius = fieldUnit('temperature_C', unitSystem);
  const { unit } = values[gas].stated;
  const path = `${gas}.stated`;
  const computed = computedGas(statedFrom(values[gas], { gas, kind, unitSystem, before: undefined }), {
    gas,
    kind,
  });
  return (
    <Sheet
      title={GAS_TITLES[gas]}
      subtitle={
        kind === 'film'
          ? 'Per thickness, or as measured on one gauge: choose the unit that your data sheet has.'
          : 'For the whole coating; its gauge does not scale it.'
      }
    >
      <FieldGrid leastWidthPx={200}>
        <FormNumberField name={`${path}.value`} label={VALUE_LABELS[gas]} />
        <FormSelect
          name={`${path}.unit`}
          label="Unit"
          options={suitableUnits(gas, kind).map((group) => ({
            label: group.kind,
            options: group.units.map((name) => ({ value: name, label: unitInPrint(name) })),
          }))}
        />
      </FieldGrid>
      <FieldGrid>
        {needsGauge(gas, kind, unit) ? (
          <FormNumberField
            name={`${path}.thickness_um`}
            label="Measured on"
            unit={fieldUnit('thickness_um', unitSystem)}
            hint="The gauge of the film in that test."
          />
        ) : null}
        <FormNumberField name={`${path}.temperature_C`} label="Measured at" unit={celsius} />
        {gas === 'oxygen' ? (
          <FormNumberField
            name={`${path}.relative_humidity`}
            label={humidityLabel(gas)}
            unit="%"
            hint="Relative humidity in the test; 0 only where it was dry."
            options={{ isOptional: isHumidityOptional }}
          />
        ) : null}
        {gas === 'oxygen' && isRate('oxygen', unit) ? (
          <FormNumberField
            name={`${path}.oxygen_mole_fraction_dry`}
            label="Oxygen in the test gas"
            unit="%"
            hint="100 for pure oxygen, 20.95 for air."
          />
        ) : null}
        {gas === 'water' && isRate('water', unit) ? (
          <FormNumberField name={`${path}.relative_humidity_high`} label="Moist side" unit="%" />
        ) : null}
        {gas === 'water' && isRate('water', unit) ? (
          <FormNumberField name={`${path}.relative_humidity_low`} label="Dry side" unit="%" />
        ) : null}
        {gas === 'water' && !isRate('water', unit) ? (
          <FormNumberField
            name={`${path}.relative_humidity`}
            label={humidityLabel(gas)}
            unit="%"
            options={{ isOptional: true }}
          />
        ) : null}
      </FieldGrid>
      <Small>
        {'block' in computed
          ? siInWords(gas, computed.block, unitSystem)
          : 'In SI: as soon as the value and its test are whole.'}
      </Small>
      <CurveFields gas={gas} />
      <FieldGrid leastWidthPx={165}>
        <FormNumberField
          name={`${path}.activation_energy_J_per_mol`}
          label="Activation energy"
          unit="kJ/mol"
          hint="How fast it rises with temperature; blank for not at all."
          options={{ isOptional: true }}
        />
        <FormNumberField
          name={`${path}.measured_temperature_min_C`}
          label="Measured from"
          unit={celsius}
          options={{ isOptional: true }}
        />
        <FormNumberField
          name={`${path}.measured_temperature_max_C`}
          label="Measured up to"
          unit={celsius}
          options={{ isOptional: true }}
        />
        <FormNumberField
          name={`${gas}.geometric_sd`}
          label="Spread"
          hint="As a factor: 1.2 means a fifth up or down."
          options={{ isOptional: true }}
        />
      </FieldGrid>
      <FieldGrid leastWidthPx={200}>
        <FormSelect
          name={`${gas}.ground.kind`}
          label="The value is"
          options={PROVENANCE_KINDS.map((each) => ({ value: each, label: provenanceInWords(each) }))}
        />
        <FormField name={`${gas}.ground.source`} label="Source" options={{ isOptional: true }} />
      </FieldGrid>
    </Sheet>
  );
}
