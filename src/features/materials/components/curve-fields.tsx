import { useFormikContext } from 'formik';
import { View } from 'react-native';
import { useUnitSystem } from '../../../session';
import {
  Button,
  FormNumberField,
  IconButton,
  Inline,
  Small,
  SPACE,
  Choice,
  useFieldBinding,
} from '../../../ui';
import { curveDisagreement, curveInMode, type CurveMode } from '../gas-form-values';
import type { MaterialFormValues } from '../material-form-values';
import { unitInPrint, type Gas } from '../unit-choice';

const MODES: { value: CurveMode; label: string }[] = [
  { value: 'none', label: 'No effect' },
  { value: 'values', label: 'Values' },
  { value: 'factors', label: 'Factors' },
];

/** How humidity changes one gas's value: rows of humidity and the value there, or a factor on it. */
export function CurveFields({ gas }: { gas: Gas }) {
  const formik = useFormikContext<MaterialFormValues>();
  const unitSystem = useUnitSystem();
  const values = formik.values[gas];
  const modeField = useFieldBinding(`${gas}.curve_mode`);

  const changeMode = (text: string) => {
    const mode = MODES.find((entry) => entry.value === text)?.value ?? 'none';
    const converted = curveInMode(values, mode, unitSystem);
    const isFirst = mode !== 'none' && values.curve.length === 0;
    const firstRow = { key: 'point-1', relative_humidity: '', amount: '' };
    void formik.setFieldValue(gas, {
      ...values,
      curve_mode: mode,
      curve: isFirst ? [firstRow] : (converted ?? values.curve),
      nextKey: isFirst ? 2 : values.nextKey,
    });
  };
  const addRow = () =>
    void formik.setFieldValue(gas, {
      ...values,
      curve: [...values.curve, { key: `point-${values.nextKey}`, relative_humidity: '', amount: '' }],
      nextKey: values.nextKey + 1,
    });
  const removeRow = (key: string) =>
    void formik.setFieldValue(gas, { ...values, curve: values.curve.filter((row) => row.key !== key) });

  const unit = unitInPrint(values.stated.unit);
  const disagreement = curveDisagreement(values, unitSystem);
  return (
    <View style={{ gap: SPACE.x2 }}>
      <Choice
        id={modeField.id}
        label="Humidity"
        value={values.curve_mode}
        options={MODES}
        error={modeField.error}
        onChange={changeMode}
        hint={MODE_HINTS[values.curve_mode]}
      />
      {values.curve_mode === 'none' ? null : (
        <>
          <Small>
            {values.curve_mode === 'values' ? `Values in ${unit}.` : 'Factors on the value above.'}
          </Small>
          {values.curve.map((row, index) => (
            <View key={row.key} style={{ flexDirection: 'row', alignItems: 'flex-end', gap: SPACE.x2 }}>
              <View style={{ width: 118 }}>
                <FormNumberField
                  name={`${gas}.curve[${index}].relative_humidity`}
                  label={`Humidity ${index + 1}`}
                  unit="%"
                />
              </View>
              <View style={{ flexGrow: 1, flexShrink: 1, minWidth: 0 }}>
                <FormNumberField
                  name={`${gas}.curve[${index}].amount`}
                  label={values.curve_mode === 'values' ? `Value ${index + 1}` : `Factor ${index + 1}`}
                />
              </View>
              <IconButton
                icon="remove"
                label={`Remove point ${index + 1} of the ${gas} curve`}
                onPress={() => removeRow(row.key)}
              />
            </View>
          ))}
          <Inline>
            <Button label="Add a point" icon="add" onPress={addRow} />
          </Inline>
          {disagreement === '' ? null : <Small tone="ink">{disagreement}</Small>}
        </>
      )}
    </View>
  );
}

const MODE_HINTS: Record<CurveMode, string> = {
  none: 'Humidity does not change the value.',
  values:
    'The value at each humidity, rising. Between points the logarithm runs straight; beyond them the last value holds.',
  factors: 'How many times the value at each humidity, rising. Between points the logarithm runs straight.',
};
