import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import * as yup from 'yup';
import { parseTypedNumber } from '../typed-number';
import { Form } from './form';
import { FormErrors } from './form-errors';
import { FormField } from './form-field';
import { FormNumberField } from './form-number-field';
import { FormSubmit } from './form-submit';
import { validateWith } from './validate-with';

interface Values {
  name: string;
  gauge_um: string;
}

const schema = yup.object({
  name: yup.string().required('Name: enter a name.'),
  gauge_um: yup
    .number()
    .typeError('Gauge: enter a number.')
    .required('Gauge: enter a number.')
    .moreThan(0, 'Gauge: more than 0 µm.'),
});
const validate = validateWith<Values>(schema, (values) => ({
  ...values,
  gauge_um: parseTypedNumber(values.gauge_um),
}));

function renderForm(onSubmit: (values: Values) => Promise<void>, toFieldName?: (path: string) => string) {
  render(
    <Form<Values>
      initialValues={{ name: '', gauge_um: '' }}
      validate={validate}
      onSubmit={onSubmit}
      toFieldName={toFieldName}
    >
      <FormField name="name" label="Name" />
      <FormNumberField name="gauge_um" label="Gauge" unit="µm" />
      <FormErrors />
      <FormSubmit label="Save" busyLabel="Saving…" />
    </Form>,
  );
  return { name: screen.getByLabelText('Name'), gauge: screen.getByLabelText('Gauge') };
}

function type(field: HTMLElement, value: string) {
  fireEvent.change(field, { target: { value } });
}

afterEach(cleanup);

describe('Form', () => {
  it('says nothing about a field until it was left, then follows what is typed', async () => {
    const { gauge } = renderForm(() => Promise.resolve());
    type(gauge, '0');
    await waitFor(() => expect(gauge).toHaveProperty('value', '0'));
    expect(screen.queryByText('Gauge: more than 0 µm.')).toBeNull();
    fireEvent.blur(gauge);
    await screen.findByText('Gauge: more than 0 µm.');
    expect(gauge.getAttribute('aria-invalid')).toBe('true');
    type(gauge, '12,5');
    await waitFor(() => expect(screen.queryByText('Gauge: more than 0 µm.')).toBeNull());
  });

  it('on submit shows every fault, sums them up and goes to the first', async () => {
    const onSubmit = vi.fn(() => Promise.resolve());
    const { name } = renderForm(onSubmit);
    fireEvent.click(screen.getByRole('button', { name: 'Save' }));
    await screen.findByText('2 fields need a look');
    expect(screen.getAllByText('Name: enter a name.')).toHaveLength(2);
    expect(screen.getAllByText('Gauge: enter a number.')).toHaveLength(2);
    await waitFor(() => expect(document.activeElement).toBe(name));
    expect(onSubmit).not.toHaveBeenCalled();
  });

  it('sends what was typed, untouched, and once for a double click', async () => {
    let finish: () => void = () => undefined;
    const onSubmit = vi.fn(() => new Promise<void>((resolve) => (finish = resolve)));
    const { name, gauge } = renderForm(onSubmit);
    type(name, 'PET');
    type(gauge, '12,50');
    const save = screen.getByRole('button', { name: 'Save' });
    fireEvent.click(save);
    fireEvent.click(save);
    await screen.findByRole('button', { name: 'Saving…' });
    expect(onSubmit).toHaveBeenCalledTimes(1);
    expect(onSubmit).toHaveBeenCalledWith({ name: 'PET', gauge_um: '12,50' });
    finish();
    await screen.findByRole('button', { name: 'Save' });
    expect(gauge).toHaveProperty('value', '12,50');
  });

  it("puts the server's faults on their fields until the value changes", async () => {
    const refusal = Object.assign(new Error('Look at one field.'), {
      fields: [{ path: 'spec.name', message: 'Name: there is one of that name.' }],
    });
    const { name, gauge } = renderForm(
      () => Promise.reject(refusal),
      (path) => path.replace(/^spec\./, ''),
    );
    type(name, 'PET');
    type(gauge, '12');
    fireEvent.click(screen.getByRole('button', { name: 'Save' }));
    expect(await screen.findAllByText('Name: there is one of that name.')).toHaveLength(2);
    await waitFor(() => expect(document.activeElement).toBe(name));
    type(name, 'PET 2');
    await waitFor(() => expect(screen.queryByText('Name: there is one of that name.')).toBeNull());
  });

  it('says what the server refused without naming a field', async () => {
    const { name, gauge } = renderForm(() => Promise.reject(new Error('The server cannot be reached.')));
    type(name, 'PET');
    type(gauge, '12');
    fireEvent.click(screen.getByRole('button', { name: 'Save' }));
    await screen.findByText('The server cannot be reached.');
  });

  it('lists the faults as the fields stand on the page', async () => {
    render(
      <Form<Values>
        initialValues={{ name: '', gauge_um: '' }}
        validate={() => ({ name: 'Name: enter a name.', gauge_um: 'Gauge: enter a number.' })}
        onSubmit={() => Promise.resolve()}
      >
        <FormNumberField name="gauge_um" label="Gauge" unit="µm" />
        <FormField name="name" label="Name" />
        <FormErrors />
        <FormSubmit label="Save" busyLabel="Saving…" />
      </Form>,
    );
    fireEvent.click(screen.getByRole('button', { name: 'Save' }));
    await screen.findByText('2 fields need a look');
    expect(screen.getAllByRole('link').map((link) => link.textContent)).toEqual([
      'Gauge: enter a number.',
      'Name: enter a name.',
    ]);
  });
});
