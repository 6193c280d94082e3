import { useFormikContext } from 'formik';
import { View } from 'react-native';
import { Button } from '../button';
import type { ButtonKind } from '../button';
import { useFormContextValue } from './form-context';
import { useIsWide } from '../use-is-wide';

export interface FormSubmitProps {
  label: string;
  /** 'Saving…' */
  busyLabel: string;
  kind?: ButtonKind;
}

/** Enabled except while sending: pressing it is how one learns what is missing. */
export function FormSubmit({ label, busyLabel, kind = 'primary' }: FormSubmitProps) {
  const formik = useFormikContext<object>();
  const isWide = useIsWide();
  const { formId } = useFormContextValue();
  return (
    <View style={{ alignSelf: isWide ? 'flex-start' : 'stretch', minWidth: 160 }}>
      <Button
        label={label}
        busyLabel={busyLabel}
        kind={kind}
        isBusy={formik.isSubmitting}
        onPress={() => {
          const form = document.getElementById(formId);
          if (form instanceof HTMLFormElement) form.requestSubmit();
        }}
      />
    </View>
  );
}
