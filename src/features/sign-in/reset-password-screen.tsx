import { useLocalSearchParams } from 'expo-router';
import { useState } from 'react';
import { passwordResetRedemptionSchema } from '../../../shared/contract/session';
import { sendPasswordResetRedemption } from '../../session/session-requests';
import {
  Form,
  FormErrors,
  FormField,
  FormSubmit,
  LinkButton,
  Notice,
  Screen,
  Sheet,
  validateWith,
} from '../../ui';

interface Values {
  password: string;
}

/** The token comes with the link in the e-mail. */
export function ResetPasswordScreen() {
  const { token = '' } = useLocalSearchParams<{ token?: string }>();
  const [isDone, setIsDone] = useState(false);
  return (
    <Screen title="New password" width="narrow" back={{ href: '/sign-in', label: 'Sign in' }}>
      {token === '' ? (
        <Notice
          kind="error"
          title="The link is not whole"
          action={<LinkButton href="/forgotten-password" label="Ask for a new link" />}
        >
          Open it from the e-mail again, or ask for a new one.
        </Notice>
      ) : isDone ? (
        <Notice
          title="Your password is changed"
          action={<LinkButton href="/sign-in" label="Sign in" kind="primary" />}
          isLive
        >
          Sessions elsewhere are signed out.
        </Notice>
      ) : (
        <Sheet>
          <Form<Values>
            initialValues={{ password: '' }}
            validate={validateWith<Values>(passwordResetRedemptionSchema, ({ password }) => ({
              token,
              password,
            }))}
            onSubmit={async ({ password }) => {
              await sendPasswordResetRedemption({ token, password });
              setIsDone(true);
            }}
            label="New password"
          >
            <FormField
              name="password"
              label="New password"
              hint="At least 12 characters. A few words in a row are easy to keep in mind."
              options={{ type: 'password', autoComplete: 'new-password' }}
            />
            <FormErrors />
            <FormSubmit label="Change the password" busyLabel="Changing…" />
          </Form>
        </Sheet>
      )}
    </Screen>
  );
}
