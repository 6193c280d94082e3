import type { InferType } from 'yup';
import {
  DEMO_MAILBOX_PATH,
  DEMO_PATH,
  PASSWORD_RESETS_PATH,
  PASSWORD_RESET_REDEMPTIONS_PATH,
  PREFERENCES_PATH,
  SESSION_PATH,
} from '../../shared/contract/session';
import type {
  demoMailboxResponseSchema,
  demoResponseSchema,
  SessionResponse,
  UnitSystem,
} from '../../shared/contract/session';
import { httpClient } from '../api/http-client';

export type DemoPerson = InferType<typeof demoResponseSchema>['people'][number];
export type DemoMessage = InferType<typeof demoMailboxResponseSchema>['items'][number];

export function fetchSession(): Promise<SessionResponse> {
  return httpClient.get<SessionResponse>(SESSION_PATH);
}

export function sendSignIn(credentials: { email: string; password: string }): Promise<SessionResponse> {
  return httpClient.post<SessionResponse>(SESSION_PATH, credentials);
}

export async function sendSignOut(): Promise<void> {
  await httpClient.delete<unknown>(SESSION_PATH);
}

export async function sendUnitSystem(unitSystem: UnitSystem): Promise<void> {
  await httpClient.patch<unknown>(PREFERENCES_PATH, { unit_system: unitSystem });
}

export async function sendPasswordReset(email: string): Promise<void> {
  await httpClient.post<unknown>(PASSWORD_RESETS_PATH, { email });
}

export async function sendPasswordResetRedemption(redemption: {
  token: string;
  password: string;
}): Promise<void> {
  await httpClient.post<unknown>(PASSWORD_RESET_REDEMPTIONS_PATH, redemption);
}

export async function fetchDemoPeople(): Promise<DemoPerson[]> {
  const answer = await httpClient.get<InferType<typeof demoResponseSchema>>(DEMO_PATH);
  return answer.people;
}

export async function fetchDemoMailbox(): Promise<DemoMessage[]> {
  const answer = await httpClient.get<InferType<typeof demoMailboxResponseSchema>>(DEMO_MAILBOX_PATH);
  return answer.items;
}
