import { Text, View } from 'react-native';
import { useAccount } from '../../../session';
import { FONTS, Icon, SIZES, SPACE, useAnchorClick, useTheme } from '../../../ui';
import { barPlacesOf, placesBehindMore } from '../places';
import type { Place } from '../places';

export function BottomBar({ current }: { current: string }) {
  const account = useAccount();
  const isBehindMore = placesBehindMore(account.roles).some((place) => place.path === current);
  return (
    <View role="navigation" aria-label="Places" style={{ flexDirection: 'row', justifyContent: 'center' }}>
      {barPlacesOf(account.roles).map((place) => (
        <BarPlace
          key={place.path}
          place={place}
          href={`${account.basePath}/${place.path}`}
          isCurrent={place.path === current || (place.path === 'more' && isBehindMore)}
        />
      ))}
    </View>
  );
}

function BarPlace({ place, href, isCurrent }: { place: Place; href: string; isCurrent: boolean }) {
  const { colors } = useTheme();
  const onClick = useAnchorClick(href);
  const color = isCurrent ? colors.ink : colors.inkSecond;
  return (
    <View
      href={href}
      onClick={onClick}
      aria-current={isCurrent ? 'page' : undefined}
      style={{
        flexGrow: 1,
        flexBasis: 0,
        maxWidth: 160,
        minHeight: 58,
        alignItems: 'center',
        justifyContent: 'center',
        gap: SPACE.x1,
        marginTop: -1,
        borderTopWidth: 2,
        borderTopColor: isCurrent ? colors.ink : 'transparent',
      }}
    >
      <Icon name={place.icon} color={color} />
      <Text style={{ fontFamily: isCurrent ? FONTS.semibold : FONTS.regular, fontSize: SIZES.label, color }}>
        {place.label}
      </Text>
    </View>
  );
}
