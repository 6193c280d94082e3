import type { ReactNode } from 'react';
import { Text, View } from 'react-native';
import { FONTS, HAIRLINE_PX, SIZES, SPACE, useAnchorClick, useTheme } from '../../ui';

/** Round the screens outside any account: the product's name and nothing to get lost in. */
export function PlainPage({ children }: { children: ReactNode }) {
  const { colors } = useTheme();
  const onClick = useAnchorClick('/');
  return (
    <View style={{ flexGrow: 1 }}>
      <View role="banner" style={{ borderBottomWidth: HAIRLINE_PX, borderBottomColor: colors.line }}>
        <View
          href="/"
          onClick={onClick}
          style={{ alignSelf: 'center', padding: SPACE.x3, minHeight: 48, justifyContent: 'center' }}
        >
          <Text style={{ fontFamily: FONTS.semibold, fontSize: SIZES.title, color: colors.ink }}>
            Larderline
          </Text>
        </View>
      </View>
      <main style={{ display: 'flex', flexDirection: 'column', flexGrow: 1, minWidth: 0 }}>{children}</main>
    </View>
  );
}
