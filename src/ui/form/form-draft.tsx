import { useFormikContext } from 'formik';
import { useEffect, useRef, useState } from 'react';
import { Button } from '../button';
import { Notice } from '../notice';

export interface FormDraftProps<Values> {
  /** True where the form started with what was left here earlier. */
  isRestored: boolean;
  isNew: boolean;
  /** What the form holds once the draft is dropped. */
  fresh: Values;
  onChange: (values: Values) => void;
  onDropped: () => void;
}

/** Keeps what is typed as it changes, and says so where it came back. */
export function FormDraft<Values extends object>(props: FormDraftProps<Values>) {
  const { isRestored, isNew, fresh, onChange, onDropped } = props;
  const formik = useFormikContext<Values>();
  const { values } = formik;
  const [isShown, setShown] = useState(isRestored);
  const lastText = useRef(JSON.stringify(values));
  useEffect(() => {
    const text = JSON.stringify(values);
    if (text === lastText.current) return;
    lastText.current = text;
    onChange(values);
  }, [values, onChange]);
  if (!isShown) return null;
  return (
    <Notice
      title="Your unsaved changes are back"
      action={
        <Button
          label={isNew ? 'Begin afresh' : 'Drop them'}
          onPress={() => {
            lastText.current = JSON.stringify(fresh);
            formik.resetForm({ values: fresh });
            onDropped();
            setShown(false);
          }}
        />
      }
    >
      They were kept on this device when the page was left.
    </Notice>
  );
}
