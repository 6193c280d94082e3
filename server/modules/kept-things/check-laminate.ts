import type { LaminateSpec } from '../../../shared/contract/laminates';
import type { FieldFault } from '../../../shared/errors/error-code';
import type { Queryable } from '../../db/client';
import { findRevisions } from '../../db/kept-thing-store';
import { materialRevisions, materials } from '../../db/schema';
import { inputInvalid } from '../../http/app-error';

/** Every layer names a material of this account and a revision of that material. */
export async function checkLaminate(db: Queryable, accountId: string, spec: LaminateSpec): Promise<void> {
  const ids = [...new Set(spec.layers.map((layer) => layer.material_revision_id))];
  const found = await findRevisions(
    db,
    { things: materials, revisions: materialRevisions },
    { accountId, ids },
  );
  const materialByRevision = new Map(found.map(({ thingId, revision }) => [revision.id, thingId]));
  const faults = spec.layers.flatMap((layer, i): FieldFault[] => {
    const materialId = materialByRevision.get(layer.material_revision_id);
    if (materialId === layer.material_id) return [];
    const field = materialId === undefined ? 'material_revision_id' : 'material_id';
    return [
      {
        path: `spec.layers[${i}].${field}`,
        value: layer[field],
        message: 'Material: choose one of this account.',
      },
    ];
  });
  if (faults.length > 0) throw inputInvalid(faults);
}
