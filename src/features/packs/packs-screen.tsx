import { useQuery } from '@tanstack/react-query';
import { View } from 'react-native';
import { describeError } from '../../api/describe-error';
import { keptThingsQueries } from '../../api/kept-things-queries';
import { formatQuantity } from '../../../shared/units/format';
import { hasRole, useAccount, useUnitSystem } from '../../session';
import { LinkButton, Row, Screen, Stack } from '../../ui';
import { FetchedList } from '../../ui/fetched-list';
import { areaOfForm } from './pouch-measures';

/** All packs of the account. */
export function PacksScreen() {
  const account = useAccount();
  const unitSystem = useUnitSystem();
  const packs = useQuery(keptThingsQueries(account.id, 'packs').all());
  const newPack = hasRole(account, ['engineer']) ? (
    <LinkButton href={`${account.basePath}/packs/new`} label="New pack" icon="add" kind="primary" />
  ) : undefined;
  return (
    <Screen title="Packs" subtitle="Areas, seals and headspace, without the wall." action={newPack}>
      <FetchedList
        what="packs"
        fetched={packs}
        failure={describeError(packs.error, 'The packs could not be fetched')}
        empty={{
          title: 'No pack yet',
          text: 'A pack is a pouch by its dimensions, or just an area; with its headspace, seals and leaks.',
          action: newPack,
        }}
        textOf={(pack) => pack.revision.spec.name}
      >
        {(items) => (
          <Stack gap="x1" role="list" label="Packs">
            {items.map((pack, index) => {
              const { spec } = pack.revision;
              const area = formatQuantity(areaOfForm(spec.form), 'area_m2', { unitSystem }).text;
              const headspace = formatQuantity(spec.headspace_cm3, 'volume_cm3', {
                unitSystem,
                isExact: true,
              }).text;
              return (
                <View key={pack.id} role="listitem">
                  <Row
                    href={`${account.basePath}/packs/${pack.id}`}
                    label={spec.name}
                    detail={`${spec.form.type === 'pouch' ? 'Pouch' : 'Given area'}, ${area}; headspace ${headspace}`}
                    value={`rev ${pack.revision.number}`}
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
