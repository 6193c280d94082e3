import { useQuery } from '@tanstack/react-query';
import { useLocalSearchParams } from 'expo-router';
import { useMemo } from 'react';
import { View } from 'react-native';
import { isApiError } from '../../api/api-error';
import { describeError } from '../../api/describe-error';
import { keptThingsQueries, type KeptLaminate } from '../../api/kept-things-queries';
import { useAccount } from '../../session';
import { EmptyState, FailedState, Link, LoadingState, Screen, SPACE, useIsAtLeast } from '../../ui';
import { WallList } from './components/wall-list';
import { useMaterialBook } from './material-book';
import { WallBuilder } from './wall-builder';

const LIST_BESIDE_FROM_PX = 1180;
const LIST_WIDTH_PX = 240;

/** A new wall. */
export function NewWallScreen() {
  return <WallPanes opened={null} />;
}

/** One wall: what it is and what it answers; changing it is the same page. */
export function WallScreen() {
  const account = useAccount();
  const { wall: id } = useLocalSearchParams<{ wall: string }>();
  const wall = useQuery(keptThingsQueries(account.id, 'laminates').one(id));
  const back = { href: `${account.basePath}/walls`, label: 'Walls' };
  if (wall.isPending) {
    return (
      <Screen title="Wall" back={back}>
        <LoadingState what="Fetching the wall" />
      </Screen>
    );
  }
  if (wall.data === undefined) {
    return (
      <Screen title="Wall" back={back}>
        {isApiError(wall.error, 'not_found') ? (
          <EmptyState title="No such wall" action={<Link href={back.href}>To the walls</Link>}>
            It may belong to another account, or the address is cut short.
          </EmptyState>
        ) : (
          <FailedState
            {...describeError(wall.error, 'The wall could not be fetched')}
            onRetry={() => void wall.refetch()}
            isRetrying={wall.isRefetching}
          />
        )}
      </Screen>
    );
  }
  return <WallPanes key={wall.data.id} opened={wall.data} />;
}

function WallPanes({ opened }: { opened: KeptLaminate | null }) {
  const account = useAccount();
  const hasListBeside = useIsAtLeast(LIST_BESIDE_FROM_PX);
  const { return: returnTo, created } = useLocalSearchParams<{ return?: string; created?: string }>();
  const layers = useMemo(() => opened?.revision.spec.layers ?? [], [opened]);
  const book = useMaterialBook(layers);
  const back = { href: `${account.basePath}/walls`, label: 'Walls' };
  return (
    <Screen
      title={opened?.revision.spec.name ?? 'New wall'}
      subtitle={opened === null ? 'From the outside face to the inside face.' : undefined}
      back={back}
      width="full"
    >
      <View style={{ flexDirection: 'row', gap: SPACE.x4, alignItems: 'flex-start' }}>
        {hasListBeside ? <WallsBeside currentId={opened?.id} /> : null}
        <View style={{ flex: 1, minWidth: 0, gap: SPACE.x4 }}>
          {book.isPending ? <LoadingState what="Fetching the materials" /> : null}
          {book.error === null ? null : (
            <FailedState
              {...describeError(book.error, 'The materials could not be fetched')}
              onRetry={book.retry}
            />
          )}
          {book.isPending || book.error !== null ? null : (
            <WallBuilder
              opened={opened}
              book={book}
              returnTo={returnTo}
              createdMaterialId={
                created?.startsWith('materials:') === true ? created.slice('materials:'.length) : undefined
              }
            />
          )}
        </View>
      </View>
    </Screen>
  );
}

function WallsBeside({ currentId }: { currentId: string | undefined }) {
  const account = useAccount();
  const walls = useQuery(keptThingsQueries(account.id, 'laminates').all());
  const materials = useQuery(keptThingsQueries(account.id, 'materials').all());
  if (walls.data?.length === 0) return null;
  return (
    <View style={{ width: LIST_WIDTH_PX }}>
      <WallList walls={walls.data ?? []} materials={materials.data ?? []} currentId={currentId} />
    </View>
  );
}
