import { describe, expect, it } from 'vitest';
import type { SessionResponse } from '../../shared/contract/session';
import { INITIAL_SESSION, sessionReducer } from './session-reducer';
import type { SessionState } from './session-reducer';

const session: SessionResponse = {
  user: {
    id: '0193a1f2-77aa-7c1e-9d2e-4f6f0a9b1c3d',
    name: 'Ida Brandt',
    email: 'ida@haselhof.example',
    unit_system: 'metric',
  },
  memberships: [],
};
const signedIn: SessionState = { status: 'signed-in', session };

describe('sessionReducer', () => {
  it('begins by asking and takes what is found', () => {
    expect(INITIAL_SESSION.status).toBe('asking');
    expect(sessionReducer(INITIAL_SESSION, { type: 'session-found', session })).toEqual(signedIn);
  });

  it('tells a first visit, an ended session and a sign-out apart', () => {
    expect(sessionReducer(INITIAL_SESSION, { type: 'session-missing' })).toEqual({
      status: 'signed-out',
      reason: 'never-in',
    });
    expect(sessionReducer(signedIn, { type: 'session-missing' })).toEqual({
      status: 'signed-out',
      reason: 'expired',
    });
    const left = sessionReducer(signedIn, { type: 'signed-out' });
    expect(left).toEqual({ status: 'signed-out', reason: 'left' });
    expect(sessionReducer(left, { type: 'session-missing' })).toBe(left);
  });

  it('keeps who is signed in when the server falls silent', () => {
    const event = { type: 'session-unreachable', error: new Error('silent') } as const;
    expect(sessionReducer(signedIn, event)).toBe(signedIn);
    expect(sessionReducer(INITIAL_SESSION, event).status).toBe('unreachable');
  });

  it('asks again from unreachable, but not over somebody signed in', () => {
    expect(sessionReducer({ status: 'unreachable', error: null }, { type: 'session-asked' })).toEqual({
      status: 'asking',
    });
    expect(sessionReducer(signedIn, { type: 'session-asked' })).toBe(signedIn);
  });

  it('changes the unit system of who is signed in and nothing else', () => {
    const next = sessionReducer(signedIn, { type: 'unit-system-chosen', unitSystem: 'us_customary' });
    expect(next).toEqual({
      status: 'signed-in',
      session: { ...session, user: { ...session.user, unit_system: 'us_customary' } },
    });
    expect(session.user.unit_system).toBe('metric');
    expect(sessionReducer(INITIAL_SESSION, { type: 'unit-system-chosen', unitSystem: 'metric' })).toBe(
      INITIAL_SESSION,
    );
  });
});
