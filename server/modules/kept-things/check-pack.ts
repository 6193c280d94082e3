import type { PackSpec } from '../../../shared/contract/packs';
import type { Queryable } from '../../db/client';
import { findRevisions, findThing } from '../../db/kept-thing-store';
import { laminateRevisions, laminates } from '../../db/schema';
import { inputInvalid } from '../../http/app-error';

const LAMINATES = { things: laminates, revisions: laminateRevisions };

/** A tray's wall is one of this account, and so is its revision; an archived one may stay, not come in anew. */
export async function checkPack(
  db: Queryable,
  { accountId, spec, base }: { accountId: string; spec: PackSpec; base?: PackSpec },
): Promise<void> {
  const { form } = spec;
  if (form.type !== 'tray') return;
  const id = form.tray_laminate_id;
  const refuse = (field: string, value: string, message: string) =>
    inputInvalid([{ path: `spec.form.${field}`, value, message }]);
  const laminate = await findThing(db, LAMINATES, { accountId, id });
  if (!laminate) throw refuse('tray_laminate_id', id, 'Wall of the tray: choose one of this account.');
  const isKept = base?.form.type === 'tray' && base.form.tray_laminate_id === id;
  if (laminate.archived_at !== null && !isKept) {
    throw refuse(
      'tray_laminate_id',
      id,
      'Wall of the tray: this one is archived. Bring it back first, or choose another.',
    );
  }
  const revisionId = form.tray_laminate_revision_id;
  if (revisionId === undefined) return;
  const [found] = await findRevisions(db, LAMINATES, { accountId, ids: [revisionId] });
  if (found?.thingId !== id) {
    throw refuse('tray_laminate_revision_id', revisionId, 'Wall of the tray: choose one of its revisions.');
  }
}
