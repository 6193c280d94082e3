import { useQueries, useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { Revision } from '../../../shared/contract/kept-things';
import type { LaminateLayer } from '../../../shared/contract/laminates';
import type { MaterialSpec } from '../../../shared/contract/materials';
import { keptThingsQueries, type KeptMaterial } from '../../api/kept-things-queries';
import { useAccount } from '../../session';

/** The materials of the account, with every revision that the walls at hand are pinned to. */
export interface MaterialBook {
  materials: KeptMaterial[];
  /** The revision a layer is pinned to; undefined while it is being fetched, or where it is gone. */
  revisionOf: (layer: PinnedLayer) => Revision<MaterialSpec> | undefined;
  /** The newest revision where the layer is pinned to an older one. */
  newerThan: (layer: PinnedLayer) => Revision<MaterialSpec> | undefined;
  isPending: boolean;
  error: Error | null;
  retry: () => void;
}

export type PinnedLayer = Pick<LaminateLayer, 'material_id' | 'material_revision_id'>;

export function useMaterialBook(layers: PinnedLayer[]): MaterialBook {
  const account = useAccount();
  const queries = keptThingsQueries(account.id, 'materials');
  const all = useQuery(queries.all());
  const materials = useMemo(() => all.data ?? [], [all.data]);

  const olderIds = useMemo(() => materialsPinnedToOlder(layers, materials), [layers, materials]);
  const older = useQueries({ queries: olderIds.map((id) => queries.revisions(id)) });
  const olderRevisions = older.flatMap((query) => query.data ?? []);

  return {
    materials,
    revisionOf: (layer) => {
      const current = materials.find((material) => material.id === layer.material_id)?.revision;
      if (current?.id === layer.material_revision_id) return current;
      return olderRevisions.find((revision) => revision.id === layer.material_revision_id);
    },
    newerThan: (layer) => {
      const current = materials.find((material) => material.id === layer.material_id)?.revision;
      return current === undefined || current.id === layer.material_revision_id ? undefined : current;
    },
    isPending: all.isPending || older.some((query) => query.isPending),
    error: all.error ?? older.find((query) => query.error !== null)?.error ?? null,
    retry: () => {
      void all.refetch();
      for (const query of older) if (query.isError) void query.refetch();
    },
  };
}

function materialsPinnedToOlder(
  layers: PinnedLayer[],
  materials: Pick<KeptMaterial, 'id' | 'revision'>[],
): string[] {
  const newest = new Map(materials.map((material) => [material.id, material.revision.id]));
  const ids = layers
    .filter(
      (layer) =>
        newest.has(layer.material_id) && newest.get(layer.material_id) !== layer.material_revision_id,
    )
    .map((layer) => layer.material_id);
  return [...new Set(ids)];
}
