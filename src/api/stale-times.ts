/** How long an answer counts as fresh, by how its subject changes. */
export const STALE_MS = {
  /** What colleagues edit: studies, walls, materials. */
  edited: 10_000,
  /** Revisions and results never change once made. */
  immutable: Number.POSITIVE_INFINITY,
  /** The session: it changes by what this page does, and it is asked again when the page is opened. */
  session: 5 * 60_000,
} as const;
