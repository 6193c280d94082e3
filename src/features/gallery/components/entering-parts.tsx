import { useState } from 'react';
import * as yup from 'yup';
import {
  Checkbox,
  Choice,
  Form,
  FormCheckbox,
  FormErrors,
  FormField,
  FormNumberField,
  FormSelect,
  FormSubmit,
  NumberField,
  Select,
  StatusLine,
  Stepper,
  TextField,
  parseTypedNumber,
  validateWith,
} from '../../../ui';
import { BothSchemes } from './both-schemes';

const FAULT = 'Gauge: 0 µm does not fit; use more than 0 and at most 2000 µm.';

export function EnteringParts() {
  return (
    <>
      <BothSchemes title="Fields">{() => <Fields />}</BothSchemes>
      <BothSchemes title="A form">{(scheme) => <SampleForm label={`Sample form, ${scheme}`} />}</BothSchemes>
    </>
  );
}

function Fields() {
  const [name, setName] = useState('');
  const [gauge, setGauge] = useState('12,5');
  const [thin, setThin] = useState('0');
  const [sealant, setSealant] = useState('60');
  const [material, setMaterial] = useState('');
  const [units, setUnits] = useState('metric');
  const [isLocked, setIsLocked] = useState(true);
  return (
    <>
      <TextField label="Name" value={name} onChange={setName} hint="As it stands in lists." />
      <TextField label="Notes" value={name} onChange={setName} options={{ lines: 2, isOptional: true }} />
      <NumberField label="Gauge" value={gauge} onChange={setGauge} unit="µm" />
      <NumberField label="Gauge of the coating" value={thin} onChange={setThin} unit="µm" error={FAULT} />
      <Stepper
        label="Gauge of PE"
        value={sealant}
        onChange={setSealant}
        unit="µm"
        step={{ by: 5, min: 5, max: 2000 }}
      />
      <Stepper
        label="Gauge of EVOH"
        value={thin}
        onChange={setThin}
        unit="µm"
        step={{ by: 1, min: 0 }}
        error={FAULT}
      />
      <Select
        label="Material"
        value={material}
        onChange={setMaterial}
        options={[
          { value: '', label: 'Choose a material' },
          { label: 'Polyesters', options: [{ value: 'pet', label: 'PET, biaxially oriented' }] },
          { label: 'Polyethylenes', options: [{ value: 'ldpe', label: 'LDPE, blown' }] },
        ]}
        error={material === '' ? 'Material: choose one.' : undefined}
      />
      <Choice
        label="Units"
        value={units}
        onChange={setUnits}
        options={[
          { value: 'metric', label: 'Metric' },
          { value: 'us_customary', label: 'US customary' },
        ]}
        hint="How figures are shown and read."
      />
      <Checkbox label="Keep the gauge of this layer" isChecked={isLocked} onChange={setIsLocked} />
      <Checkbox
        label="Count the seal as wall"
        isChecked={false}
        onChange={() => undefined}
        error="Seal: give its length first."
      />
    </>
  );
}

interface SampleValues {
  name: string;
  gauge: string;
  side: string;
  isSealant: boolean;
}

const sampleSchema = yup.object({
  name: yup.string().required('Name: enter a name.'),
  gauge: yup
    .number()
    .typeError('Gauge: enter a number, more than 0 and at most 2000 µm.')
    .required('Gauge: enter a number, more than 0 and at most 2000 µm.')
    .moreThan(0, FAULT),
  side: yup.string().required('Side: choose one.'),
});

function SampleForm({ label }: { label: string }) {
  const [message, setMessage] = useState('');
  const initialValues: SampleValues = { name: '', gauge: '', side: '', isSealant: false };
  return (
    <Form
      label={label}
      initialValues={initialValues}
      validate={validateWith<SampleValues>(sampleSchema, (values) => ({
        ...values,
        gauge: parseTypedNumber(values.gauge),
      }))}
      onSubmit={(values) => {
        setMessage(`Taken as typed: ${values.name}, ${values.gauge} µm.`);
        return Promise.resolve();
      }}
    >
      <FormField name="name" label="Name" />
      <FormNumberField name="gauge" label="Gauge" unit="µm" />
      <FormSelect
        name="side"
        label="Side"
        options={[
          { value: '', label: 'Choose a side' },
          { value: 'outside', label: 'Outside' },
          { value: 'inside', label: 'Inside' },
        ]}
      />
      <FormCheckbox name="isSealant" label="Seals against itself" />
      <FormErrors />
      <FormSubmit label="Save" busyLabel="Saving…" />
      <StatusLine message={message} />
    </Form>
  );
}
