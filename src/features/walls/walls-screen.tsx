import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { describeError } from '../../api/describe-error';
import { keptThingsQueries } from '../../api/kept-things-queries';
import { hasRole, useAccount } from '../../session';
import { EmptyState, FailedState, LinkButton, LoadingState, Screen, Small, TextField } from '../../ui';
import { WallList } from './components/wall-list';

const SEARCH_FROM = 8;

/** All walls of the account. */
export function WallsScreen() {
  const account = useAccount();
  const walls = useQuery(keptThingsQueries(account.id, 'laminates').all());
  const materials = useQuery(keptThingsQueries(account.id, 'materials').all());
  const [search, setSearch] = useState('');
  const newWall = hasRole(account, ['engineer']) ? (
    <LinkButton href={`${account.basePath}/walls/new`} label="New wall" icon="add" kind="primary" />
  ) : undefined;

  if (walls.isPending) {
    return (
      <Screen title="Walls">
        <LoadingState what="Fetching the walls" />
      </Screen>
    );
  }
  if (walls.isError) {
    return (
      <Screen title="Walls">
        <FailedState
          {...describeError(walls.error, 'The walls could not be fetched')}
          onRetry={() => void walls.refetch()}
          isRetrying={walls.isRefetching}
        />
      </Screen>
    );
  }
  const found = walls.data.filter((wall) =>
    wall.revision.spec.name.toLowerCase().includes(search.trim().toLowerCase()),
  );
  return (
    <Screen
      title="Walls"
      subtitle="Laminates, layer by layer, from the outside face to the inside face."
      action={newWall}
    >
      {walls.data.length === 0 ? (
        <EmptyState title="No wall yet" action={newWall}>
          A wall is a laminate: its layers in order, each a material at a gauge. Build one and it answers at
          once.
        </EmptyState>
      ) : (
        <>
          {walls.data.length < SEARCH_FROM ? null : (
            <TextField
              label="Search by name"
              value={search}
              onChange={setSearch}
              options={{ type: 'search', isOptional: true }}
            />
          )}
          {found.length === 0 ? <Small>{`No wall is called anything like “${search.trim()}”.`}</Small> : null}
          <WallList walls={found} materials={materials.data ?? []} />
        </>
      )}
    </Screen>
  );
}
