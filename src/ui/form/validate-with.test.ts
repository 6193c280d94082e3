import { expect, it } from 'vitest';
import * as yup from 'yup';
import { faultsByName } from './fault-list';
import { validateWith } from './validate-with';

const schema = yup.object({
  name: yup.string().required('Name: enter a name.').min(3, 'Name: at least 3 characters.'),
  layers: yup.array(yup.object({ thickness_um: yup.number().required('Gauge: enter a number.') })),
});

it('puts the first fault of each path where the form looks for it', () => {
  const errors = validateWith(
    schema,
    (values: object) => values,
  )({ name: '', layers: [{ thickness_um: 1 }, {}] });
  expect(errors).toEqual({
    name: 'Name: enter a name.',
    layers: [undefined, { thickness_um: 'Gauge: enter a number.' }],
  });
  expect(faultsByName(errors)).toEqual([
    { name: 'name', message: 'Name: enter a name.' },
    { name: 'layers[1].thickness_um', message: 'Gauge: enter a number.' },
  ]);
});

it('finds nothing wrong with what is right', () => {
  expect(validateWith(schema, (values: object) => values)({ name: 'PET', layers: [] })).toEqual({});
});

it('lets a mistake of the program through', () => {
  const validate = validateWith(schema, () => {
    throw new TypeError('a mistake');
  });
  expect(() => validate({})).toThrow('a mistake');
});
