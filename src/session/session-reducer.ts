import type { SessionResponse, UnitSystem } from '../../shared/contract/session';

export type SessionState =
  | { status: 'asking' }
  /** Whether somebody is signed in is not known, because the server did not answer. */
  | { status: 'unreachable'; error: unknown }
  | { status: 'signed-out'; reason: 'never-in' | 'left' | 'expired' }
  | { status: 'signed-in'; session: SessionResponse };

export type SessionEvent =
  | { type: 'session-asked' }
  | { type: 'session-found'; session: SessionResponse }
  | { type: 'session-missing' }
  | { type: 'session-unreachable'; error: unknown }
  | { type: 'signed-in'; session: SessionResponse }
  | { type: 'signed-out' }
  | { type: 'unit-system-chosen'; unitSystem: UnitSystem };

export const INITIAL_SESSION: SessionState = { status: 'asking' };

export function sessionReducer(state: SessionState, event: SessionEvent): SessionState {
  switch (event.type) {
    case 'session-asked':
      return state.status === 'signed-in' ? state : { status: 'asking' };
    case 'session-found':
    case 'signed-in':
      return { status: 'signed-in', session: event.session };
    case 'session-missing':
      // Who was in and is told 401 by any request has been signed out by time or by somebody else.
      if (state.status === 'signed-in') return { status: 'signed-out', reason: 'expired' };
      return state.status === 'signed-out' ? state : { status: 'signed-out', reason: 'never-in' };
    case 'session-unreachable':
      return state.status === 'signed-in' ? state : { status: 'unreachable', error: event.error };
    case 'signed-out':
      return { status: 'signed-out', reason: 'left' };
    case 'unit-system-chosen':
      return state.status === 'signed-in' ? withUnitSystem(state, event.unitSystem) : state;
  }
}

function withUnitSystem(state: SessionState & { status: 'signed-in' }, unitSystem: UnitSystem): SessionState {
  const { session } = state;
  return { status: 'signed-in', session: { ...session, user: { ...session.user, unit_system: unitSystem } } };
}
