import { useState } from 'react';
import { passwordResetSchema } from '../../../shared/contract/session';
import { sendPasswordReset } from '../../session/session-requests';
import { Form, FormErrors, FormField, FormSubmit, Notice, Screen, Sheet, validateWith } from '../../ui';

interface Values {
  email: string;
}

const trimmed = ({ email }: Values): Values => ({ email: email.trim() });
const validate = validateWith<Values>(passwordResetSchema, trimmed);

export function ForgottenPasswordScreen() {
  const [sentTo, setSentTo] = useState<string | null>(null);
  return (
    <Screen title="Forgotten password" width="narrow" back={{ href: '/sign-in', label: 'Sign in' }}>
      {sentTo === null ? (
        <Sheet subtitle="We send a link to your address; it works once and for one hour.">
          <Form
            initialValues={{ email: '' }}
            validate={validate}
            onSubmit={async (values) => {
              const { email } = trimmed(values);
              await sendPasswordReset(email);
              setSentTo(email);
            }}
            label="Forgotten password"
          >
            <FormField name="email" label="E-mail" options={{ type: 'email', autoComplete: 'username' }} />
            <FormErrors />
            <FormSubmit label="Send the link" busyLabel="Sending…" />
          </Form>
        </Sheet>
      ) : (
        <Notice title="Look into your mailbox" isLive>
          {`If ${sentTo} belongs to an account here, a link is on its way. Nothing there after some minutes? Check the address and ask again.`}
        </Notice>
      )}
    </Screen>
  );
}
