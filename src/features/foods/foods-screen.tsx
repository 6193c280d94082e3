import { useQuery } from '@tanstack/react-query';
import { View } from 'react-native';
import { formatQuantity, type DisplayUnitSystem } from '../../../shared/units/format';
import { describeError } from '../../api/describe-error';
import { keptThingsQueries, type FoodSpec } from '../../api/kept-things-queries';
import { hasRole, useAccount, useUnitSystem } from '../../session';
import { LinkButton, Row, Screen, Stack } from '../../ui';
import { FetchedList } from '../../ui/fetched-list';

/** All foods of the account. */
export function FoodsScreen() {
  const account = useAccount();
  const unitSystem = useUnitSystem();
  const foods = useQuery(keptThingsQueries(account.id, 'foods').all());
  const newFood = hasRole(account, ['engineer']) ? (
    <LinkButton href={`${account.basePath}/foods/new`} label="New food" icon="add" kind="primary" />
  ) : undefined;
  return (
    <Screen title="Foods" subtitle="How much oxygen and moisture each can bear." action={newFood}>
      <FetchedList
        what="foods"
        fetched={foods}
        failure={describeError(foods.error, 'The foods could not be fetched')}
        empty={{
          title: 'No food yet',
          text: 'A food is a mass with its limits: how it takes oxygen, and how its moisture follows the air.',
          action: newFood,
        }}
        textOf={(food) => food.revision.spec.name}
      >
        {(items) => (
          <Stack gap="x1" role="list" label="Foods">
            {items.map((food, index) => (
              <View key={food.id} role="listitem">
                <Row
                  href={`${account.basePath}/foods/${food.id}`}
                  label={food.revision.spec.name}
                  detail={foodInWords(food.revision.spec, unitSystem)}
                  value={`rev ${food.revision.number}`}
                  isLast={index === items.length - 1}
                />
              </View>
            ))}
          </Stack>
        )}
      </FetchedList>
    </Screen>
  );
}

function foodInWords({ food, limits }: FoodSpec, unitSystem: DisplayUnitSystem): string {
  const parts = [formatQuantity(food.mass_kg, 'mass_kg', { unitSystem, isExact: true }).text];
  if (limits.oxygen_uptake_mg_per_kg !== undefined) {
    parts.push(
      `oxygen ${formatQuantity(limits.oxygen_uptake_mg_per_kg, 'oxygen_uptake_mg_per_kg', { unitSystem, isExact: true }).text}`,
    );
  }
  if (limits.headspace_oxygen_percent !== undefined)
    parts.push(`headspace oxygen ${limits.headspace_oxygen_percent} %`);
  const { moisture_max_g_per_g: most, moisture_min_g_per_g: least } = limits;
  const moisture = (value: number) =>
    formatQuantity(value, 'moisture_g_per_g', { unitSystem, isExact: true }).text;
  if (most !== undefined) parts.push(`moisture up to ${moisture(most)}`);
  if (least !== undefined) parts.push(`moisture down to ${moisture(least)}`);
  return parts.join(', ');
}
