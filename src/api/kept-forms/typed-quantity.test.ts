import { describe, expect, it } from 'vitest';
import * as yup from 'yup';
import { closedObject, quantity } from '../../../shared/contract/fields';
import { RULES } from '../../../shared/contract/rules';
import { FieldReader, fieldText } from './typed-quantity';
import { validateKeptForm } from './validate-kept-form';

describe('FieldReader', () => {
  it('converts, and notes what was typed in another unit', () => {
    const reader = new FieldReader('us_customary');
    expect(reader.read('width_mm', '6', { kind: 'length_mm' })).toBe(152.4);
    expect(reader.typed()).toEqual({ typed: { width_mm: { value: 6, unit: 'in' } } });
  });

  it('leaves a value exact that was only shown rounded', () => {
    const reader = new FieldReader('us_customary');
    const shown = fieldText(150, 'length_mm', 'us_customary');
    expect(shown).toBe('5.90551');
    expect(reader.read('width_mm', shown, { kind: 'length_mm', before: 150 })).toBe(150);
    expect(reader.typed()).toEqual({});
  });

  it('tells a blank from what is no number', () => {
    const reader = new FieldReader('metric');
    expect(reader.read('x', '  ', { kind: 'number' })).toBeUndefined();
    expect(reader.read('x', 'wide', { kind: 'number' })).toBeNaN();
    expect(reader.readRequired('x', '', { kind: 'number' })).toBeNaN();
  });
});

describe('validateKeptForm', () => {
  const schema = closedObject({
    layers: yup
      .array(closedObject({ thickness_um: quantity(RULES.gauge) }))
      .strict()
      .required(),
  });
  const validate = (text: string, unitSystem: 'metric' | 'us_customary') =>
    validateKeptForm<{ layers: { thickness_um: string }[] }>({
      schema,
      toSpec: (values) => {
        const reader = new FieldReader(unitSystem);
        return {
          layers: values.layers.map((layer, index) => ({
            thickness_um: reader.readRequired(`layers[${index}].thickness_um`, layer.thickness_um, {
              kind: 'thickness_um',
            }),
          })),
        };
      },
      kindAt: () => 'thickness_um',
      unitSystem,
    })({ layers: [{ thickness_um: text }] });
  const firstFault = (text: string, unitSystem: 'metric' | 'us_customary') =>
    validate(text, unitSystem).layers?.[0];

  it('names field, value and remedy in the unit that was typed', () => {
    expect(firstFault('0', 'metric')).toEqual({
      thickness_um: 'Gauge: 0 µm does not fit; use more than 0 and at most 2000 µm.',
    });
    expect(firstFault('0', 'us_customary')).toEqual({
      thickness_um: 'Gauge: 0 mil does not fit; use more than 0 and at most 78.7402 mil.',
    });
    expect(firstFault('thin', 'metric')).toEqual({
      thickness_um: 'Gauge: “thin” is no number; enter more than 0 and at most 2000 µm.',
    });
    expect(firstFault('', 'us_customary')).toEqual({
      thickness_um: 'Gauge: enter a number, more than 0 and at most 78.7402 mil.',
    });
  });

  it('says nothing where all is well', () => {
    expect(validate('12', 'metric')).toEqual({});
  });
});
