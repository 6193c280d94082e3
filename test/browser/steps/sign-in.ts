import type { OwnPerson } from '../harness/own-account';
import type { JourneyPage } from '../harness/browser';
import { fillFields } from './fields';

export async function openSignIn({ page }: JourneyPage): Promise<void> {
  await page.goto('/sign-in');
  await page.getByRole('heading', { name: 'Sign in', level: 1 }).waitFor();
  // The demo people stand beside the form once they are fetched.
  await page.getByRole('heading', { name: 'Demo people' }).waitFor();
}

export async function signIn(visit: JourneyPage, { email, password }: OwnPerson): Promise<void> {
  const { page, press } = visit;
  await openSignIn(visit);
  await fillFields(page, { 'E-mail': email, Password: password });
  await press(page.getByRole('button', { name: 'Sign in', exact: true }));
  await page.waitForURL(/\/a\//);
  await page.getByRole('heading', { level: 1 }).waitFor();
}
