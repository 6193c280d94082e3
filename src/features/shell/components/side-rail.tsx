import { Text, View } from 'react-native';
import { useAccount } from '../../../session';
import { FONTS, Icon, ROW_MIN_PX, SIZES, SPACE, useAnchorClick, useTheme } from '../../../ui';
import { placesOf } from '../places';
import type { Place } from '../places';

export function SideRail({ current }: { current: string }) {
  const account = useAccount();
  return (
    <View role="navigation" aria-label="Places" style={{ paddingHorizontal: SPACE.x2 }}>
      {placesOf(account.roles).map((place) => (
        <RailPlace
          key={place.path}
          place={place}
          href={`${account.basePath}/${place.path}`}
          isCurrent={place.path === current}
        />
      ))}
    </View>
  );
}

function RailPlace({ place, href, isCurrent }: { place: Place; href: string; isCurrent: boolean }) {
  const { colors } = useTheme();
  const onClick = useAnchorClick(href);
  const color = isCurrent ? colors.ink : colors.inkSecond;
  return (
    <View
      href={href}
      onClick={onClick}
      aria-current={isCurrent ? 'page' : undefined}
      className="hover-underline"
      style={{
        minHeight: ROW_MIN_PX,
        flexDirection: 'row',
        alignItems: 'center',
        gap: SPACE.x3,
        paddingHorizontal: SPACE.x2,
        borderLeftWidth: 3,
        borderLeftColor: isCurrent ? colors.ink : 'transparent',
        backgroundColor: isCurrent ? colors.sheet : 'transparent',
      }}
    >
      <Icon name={place.icon} sizePx={18} color={color} />
      <Text
        style={{ fontFamily: isCurrent ? FONTS.semibold : FONTS.regular, fontSize: SIZES.heading, color }}
      >
        {place.label}
      </Text>
    </View>
  );
}
