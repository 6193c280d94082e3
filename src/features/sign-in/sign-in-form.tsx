import { signInSchema } from '../../../shared/contract/session';
import { useSessionActions } from '../../session';
import { Form, FormErrors, FormField, FormSubmit, validateWith } from '../../ui';

export interface SignInValues {
  email: string;
  password: string;
}

const validate = validateWith<SignInValues>(signInSchema, trimmed);

/** Where it leads is decided by the route, which sees that somebody is signed in. */
export function SignInForm({ filled }: { filled: SignInValues }) {
  const { signIn } = useSessionActions();
  return (
    <Form
      initialValues={filled}
      validate={validate}
      onSubmit={(values) => signIn(trimmed(values))}
      label="Sign in"
    >
      <FormField name="email" label="E-mail" options={{ type: 'email', autoComplete: 'username' }} />
      <FormField
        name="password"
        label="Password"
        options={{ type: 'password', autoComplete: 'current-password' }}
      />
      <FormErrors />
      <FormSubmit label="Sign in" busyLabel="Signing in…" />
    </Form>
  );
}

/** A space behind a pasted address is not part of it. The password is sent as typed. */
function trimmed({ email, password }: SignInValues): SignInValues {
  return { email: email.trim(), password };
}
