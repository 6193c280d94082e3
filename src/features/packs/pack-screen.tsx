import { useQuery } from '@tanstack/react-query';
import { useLocalSearchParams } from 'expo-router';
import { useState } from 'react';
import { isApiError } from '../../api/api-error';
import { describeError } from '../../api/describe-error';
import { keptThingsQueries } from '../../api/kept-things-queries';
import { hasRole, useAccount } from '../../session';
import { Screen } from '../../ui';
import { FetchedScreen } from '../../ui/fetched-screen';
import { ReadingOnly } from '../../ui/form/reading-only';
import { PackForm } from './pack-form';

/** A new pack. */
export function NewPackScreen() {
  const account = useAccount();
  const { return: returnTo } = useLocalSearchParams<{ return?: string }>();
  return (
    <Screen title="New pack" back={{ href: `${account.basePath}/packs`, label: 'Packs' }}>
      {hasRole(account, ['engineer']) ? (
        <PackForm opened={null} returnTo={returnTo} onTheirsTaken={() => undefined} />
      ) : (
        <ReadingOnly what="packs" />
      )}
    </Screen>
  );
}

/** One pack; changing it is the same page. */
export function PackScreen() {
  const account = useAccount();
  const { pack: id } = useLocalSearchParams<{ pack: string }>();
  const pack = useQuery(keptThingsQueries(account.id, 'packs').one(id));
  const [timesTaken, setTimesTaken] = useState(0);
  const back = { href: `${account.basePath}/packs`, label: 'Packs' };
  return (
    <FetchedScreen
      title="Pack"
      back={back}
      fetched={pack}
      isMissing={isApiError(pack.error, 'not_found')}
      failure={describeError(pack.error, 'The pack could not be fetched')}
    >
      {(opened) => (
        <Screen title={opened.revision.spec.name} subtitle={`Revision ${opened.revision.number}`} back={back}>
          <PackForm
            key={`${opened.id} ${timesTaken}`}
            opened={opened}
            returnTo={undefined}
            onTheirsTaken={() => setTimesTaken(timesTaken + 1)}
          />
        </Screen>
      )}
    </FetchedScreen>
  );
}
