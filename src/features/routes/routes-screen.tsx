import { useQuery } from '@tanstack/react-query';
import { View } from 'react-native';
import { formatExact } from '../../../shared/units/format';
import { describeError } from '../../api/describe-error';
import { keptThingsQueries } from '../../api/kept-things-queries';
import { hasRole, useAccount } from '../../session';
import { LinkButton, Row, Screen, Stack } from '../../ui';
import { FetchedList } from '../../ui/fetched-list';

/** All routes of the account. */
export function RoutesScreen() {
  const account = useAccount();
  const routes = useQuery(keptThingsQueries(account.id, 'routes').all());
  const newRoute = hasRole(account, ['engineer']) ? (
    <LinkButton href={`${account.basePath}/routes/new`} label="New route" icon="add" kind="primary" />
  ) : undefined;
  return (
    <Screen title="Routes" subtitle="The climates a pack passes through, leg by leg." action={newRoute}>
      <FetchedList
        what="routes"
        fetched={routes}
        failure={describeError(routes.error, 'The routes could not be fetched')}
        empty={{
          title: 'No route yet',
          text: 'A route is a list of legs, each with its temperature, humidity and days.',
          action: newRoute,
        }}
        textOf={(route) => route.revision.spec.name}
      >
        {(items) => (
          <Stack gap="x1" role="list" label="Routes">
            {items.map((route, index) => {
              const { legs, after_last } = route.revision.spec.route;
              const days = legs.reduce((sum, leg) => sum + leg.days, 0);
              const count = legs.length === 1 ? '1 leg' : `${legs.length} legs`;
              return (
                <View key={route.id} role="listitem">
                  <Row
                    href={`${account.basePath}/routes/${route.id}`}
                    label={route.revision.spec.name}
                    detail={`${count}, ${formatExact(days)} days, ${after_last === 'hold' ? 'then stays there' : 'then begins again'}`}
                    value={`rev ${route.revision.number}`}
                    isLast={index === items.length - 1}
                  />
                </View>
              );
            })}
          </Stack>
        )}
      </FetchedList>
    </Screen>
  );
}
