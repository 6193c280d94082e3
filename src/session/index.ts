export { SessionProvider, useSession, useSessionActions, useUnitSystem } from './session-provider';
export type { SessionActions } from './session-provider';
export type { SessionEvent, SessionState } from './session-reducer';
export { AccountProvider, hasRole, landingHref, landingPlace, toAccount, useAccount } from './account';
export type { Account } from './account';
export { RoleGate } from './role-gate';
export { useDraft, type Draft } from './use-draft';
export { useFormDraft, useHasDraft, type FormDraft } from './use-form-draft';
