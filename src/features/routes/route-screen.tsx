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
import { RouteForm } from './route-form';

/** A new route. */
export function NewRouteScreen() {
  const account = useAccount();
  const { return: returnTo } = useLocalSearchParams<{ return?: string }>();
  return (
    <Screen title="New route" back={{ href: `${account.basePath}/routes`, label: 'Routes' }}>
      {hasRole(account, ['engineer']) ? (
        <RouteForm opened={null} returnTo={returnTo} onTheirsTaken={() => undefined} />
      ) : (
        <ReadingOnly what="routes" />
      )}
    </Screen>
  );
}

/** One route; changing it is the same page. */
export function RouteScreen() {
  const account = useAccount();
  const { route: id } = useLocalSearchParams<{ route: string }>();
  const route = useQuery(keptThingsQueries(account.id, 'routes').one(id));
  const [timesTaken, setTimesTaken] = useState(0);
  const back = { href: `${account.basePath}/routes`, label: 'Routes' };
  return (
    <FetchedScreen
      title="Route"
      back={back}
      fetched={route}
      isMissing={isApiError(route.error, 'not_found')}
      failure={describeError(route.error, 'The route could not be fetched')}
    >
      {(opened) => (
        <Screen title={opened.revision.spec.name} subtitle={`Revision ${opened.revision.number}`} back={back}>
          <RouteForm
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
