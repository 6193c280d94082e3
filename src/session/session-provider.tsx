import { useQueryClient } from '@tanstack/react-query';
import { createContext, useCallback, useContext, useEffect, useMemo, useReducer } from 'react';
import type { ReactNode } from 'react';
import type { UnitSystem } from '../../shared/contract/session';
import { isApiError } from '../api/api-error';
import { clearDraftsOfUser } from './draft-store';
import { INITIAL_SESSION, sessionReducer } from './session-reducer';
import type { SessionState } from './session-reducer';
import { fetchSession, sendSignIn, sendSignOut, sendUnitSystem } from './session-requests';

export interface SessionActions {
  ask: () => Promise<void>;
  signIn: (credentials: { email: string; password: string }) => Promise<void>;
  signOut: () => Promise<void>;
  chooseUnitSystem: (unitSystem: UnitSystem) => Promise<void>;
}

export interface SessionContextValue {
  state: SessionState;
  actions: SessionActions;
}

const SessionContext = createContext<SessionContextValue | null>(null);

export function SessionProvider({ children }: { children: ReactNode }) {
  const [state, dispatch] = useReducer(sessionReducer, INITIAL_SESSION);
  const queryClient = useQueryClient();
  const userId = state.status === 'signed-in' ? state.session.user.id : null;

  const ask = useCallback(async () => {
    dispatch({ type: 'session-asked' });
    try {
      dispatch({ type: 'session-found', session: await fetchSession() });
    } catch (error) {
      if (isApiError(error, 'session_missing')) dispatch({ type: 'session-missing' });
      else dispatch({ type: 'session-unreachable', error });
    }
  }, []);

  const signIn = useCallback(
    async (credentials: { email: string; password: string }) => {
      const session = await sendSignIn(credentials);
      queryClient.clear();
      dispatch({ type: 'signed-in', session });
    },
    [queryClient],
  );

  const signOut = useCallback(async () => {
    try {
      await sendSignOut();
    } catch (error) {
      // A session that is gone already is what was asked for.
      if (!isApiError(error, 'session_missing')) throw error;
    }
    if (userId !== null) clearDraftsOfUser(userId);
    queryClient.clear();
    dispatch({ type: 'signed-out' });
  }, [queryClient, userId]);

  const chooseUnitSystem = useCallback(async (unitSystem: UnitSystem) => {
    await sendUnitSystem(unitSystem);
    dispatch({ type: 'unit-system-chosen', unitSystem });
  }, []);

  useEffect(() => {
    void ask();
  }, [ask]);

  // Any request may be the one that learns that the session has ended.
  useEffect(() => {
    const onError = (error: unknown) => {
      if (isApiError(error, 'session_missing')) dispatch({ type: 'session-missing' });
    };
    const stopQueries = queryClient.getQueryCache().subscribe((event) => {
      if (event.type === 'updated' && event.action.type === 'error') onError(event.action.error);
    });
    const stopMutations = queryClient.getMutationCache().subscribe((event) => {
      if (event.type === 'updated' && event.action.type === 'error') onError(event.action.error);
    });
    return () => {
      stopQueries();
      stopMutations();
    };
  }, [queryClient]);

  const value = useMemo<SessionContextValue>(
    () => ({ state, actions: { ask, signIn, signOut, chooseUnitSystem } }),
    [state, ask, signIn, signOut, chooseUnitSystem],
  );
  return <SessionContext.Provider value={value}>{children}</SessionContext.Provider>;
}

function useSessionContext(): SessionContextValue {
  const value = useContext(SessionContext);
  if (value === null) throw new Error('useSession needs a SessionProvider above it.');
  return value;
}

export function useSession(): SessionState {
  return useSessionContext().state;
}

export function useSessionActions(): SessionActions {
  return useSessionContext().actions;
}

/** The person's choice; metric while nobody is signed in. */
export function useUnitSystem(): UnitSystem {
  const state = useSession();
  return state.status === 'signed-in' ? state.session.user.unit_system : 'metric';
}
