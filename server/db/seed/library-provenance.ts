import { PROVENANCE_KINDS, type ProvenanceEntry } from '../../../shared/contract/materials';

export type LibraryProvenance = Readonly<
  Record<string, { kind: string; source: string; note: string } | undefined>
>;
export type LibrarySources = Readonly<Record<string, { text: string; read?: string }>>;

/** Provenance as the library keeps it, by field, with its source written out. */
export function provenanceOf(provenance: LibraryProvenance, sources: LibrarySources): ProvenanceEntry[] {
  return Object.entries(provenance).flatMap(([field, entry]) => {
    if (!entry) return [];
    const { kind, source, note } = entry;
    const known = PROVENANCE_KINDS.find((one) => one === kind);
    if (!known) throw new Error(`${field}: "${kind}" is no kind of provenance.`);
    return { field, kind: known, source: sources[source]?.text ?? source, note };
  });
}
