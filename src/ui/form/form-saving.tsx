import { useFormikContext } from 'formik';
import { Button } from '../button';
import { ConflictNotice } from '../conflict-notice';
import { DataTable } from '../data-table';
import { FailedState } from '../failed-state';
import { Inline, Stack } from '../stack';
import { StatusLine } from '../status-line';
import { FormErrors } from './form-errors';
import { FormSubmit } from './form-submit';

export interface FormDifference {
  field: string;
  mine: string;
  theirs: string;
}

export interface FormSavingProps<Values> {
  submitLabel: string;
  /** False for people who only read here: there is no foot then. */
  canSave: boolean;
  /** What just happened; '' while there is nothing to say. */
  said: string;
  fault: { title: string; message: string; reference?: string } | null;
  /** Somebody else saved first. */
  conflict: {
    /** 'This pack' */
    what: string;
    /** 'Save mine as a new pack' */
    asNewLabel: string;
    isBusy: boolean;
    differences: (values: Values) => FormDifference[];
    onKeepMine: (values: Values) => void;
    onTakeTheirs: () => void;
    onSaveAsNew: (values: Values) => void;
  } | null;
}

/** The foot of a form that is saved in revisions: faults, a lost race, the button, and what came of it. */
export function FormSaving<Values>({ submitLabel, canSave, said, fault, conflict }: FormSavingProps<Values>) {
  const { values } = useFormikContext<Values>();
  if (!canSave) return null;
  return (
    <Stack gap="x3">
      {conflict === null ? null : (
        <ConflictNotice
          what={conflict.what}
          isBusy={conflict.isBusy}
          onKeepMine={() => conflict.onKeepMine(values)}
          onTakeTheirs={conflict.onTakeTheirs}
        >
          <Stack gap="x2">
            <DataTable
              caption="What differs"
              columns={[
                { key: 'field', title: 'Field' },
                { key: 'mine', title: 'Mine' },
                { key: 'theirs', title: 'Theirs' },
              ]}
              rows={conflict
                .differences(values)
                .map((difference) => ({ id: difference.field, ...difference }))}
              emptyText="Nothing but the time of saving."
            />
            <Button
              label={conflict.asNewLabel}
              isDisabled={conflict.isBusy}
              onPress={() => conflict.onSaveAsNew(values)}
            />
          </Stack>
        </ConflictNotice>
      )}
      {fault === null ? null : <FailedState {...fault} />}
      <FormErrors />
      <Inline>
        <FormSubmit label={submitLabel} busyLabel="Saving…" />
      </Inline>
      <StatusLine message={said} />
    </Stack>
  );
}
