import { View } from 'react-native';
import { useAccount } from '../../session';
import { Icon, Row, Screen, Sheet } from '../../ui';
import { placesBehindMore } from './places';

export function MoreScreen() {
  const account = useAccount();
  const places = placesBehindMore(account.roles);
  return (
    <Screen title="More" subtitle={account.name}>
      <Sheet>
        <View>
          {places.map((place, index) => (
            <Row
              key={place.path}
              label={place.label}
              href={`${account.basePath}/${place.path}`}
              value={<Icon name={place.icon} sizePx={18} />}
              isLast={index === places.length - 1}
            />
          ))}
        </View>
      </Sheet>
    </Screen>
  );
}
