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
import { FoodForm } from './food-form';

/** A new food. */
export function NewFoodScreen() {
  const account = useAccount();
  const { return: returnTo } = useLocalSearchParams<{ return?: string }>();
  return (
    <Screen title="New food" back={{ href: `${account.basePath}/foods`, label: 'Foods' }}>
      {hasRole(account, ['engineer']) ? (
        <FoodForm opened={null} returnTo={returnTo} onTheirsTaken={() => undefined} />
      ) : (
        <ReadingOnly what="foods" />
      )}
    </Screen>
  );
}

/** One food; changing it is the same page. */
export function FoodScreen() {
  const account = useAccount();
  const { food: id } = useLocalSearchParams<{ food: string }>();
  const food = useQuery(keptThingsQueries(account.id, 'foods').one(id));
  const [timesTaken, setTimesTaken] = useState(0);
  const back = { href: `${account.basePath}/foods`, label: 'Foods' };
  return (
    <FetchedScreen
      title="Food"
      back={back}
      fetched={food}
      isMissing={isApiError(food.error, 'not_found')}
      failure={describeError(food.error, 'The food could not be fetched')}
    >
      {(opened) => (
        <Screen title={opened.revision.spec.name} subtitle={`Revision ${opened.revision.number}`} back={back}>
          <FoodForm
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
