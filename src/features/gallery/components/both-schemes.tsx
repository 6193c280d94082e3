import type { ReactNode } from 'react';
import { View } from 'react-native';
import { HAIRLINE_PX, Heading, SPACE, ThemeScope, useTheme } from '../../../ui';
import type { Scheme } from '../../../ui';

const SCHEMES: Scheme[] = ['light', 'dark'];

export interface BothSchemesProps {
  title: string;
  children: (scheme: Scheme) => ReactNode;
}

export function BothSchemes({ title, children }: BothSchemesProps) {
  const { colors } = useTheme();
  return (
    <View
      style={{
        gap: SPACE.x3,
        paddingTop: SPACE.x4,
        borderTopWidth: HAIRLINE_PX,
        borderTopColor: colors.line,
      }}
    >
      <Heading>{title}</Heading>
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', gap: SPACE.x4 }}>
        {SCHEMES.map((scheme) => (
          <View
            key={scheme}
            testID={`gallery-${scheme}`}
            style={{ flexGrow: 1, flexBasis: 320, minWidth: 0, maxWidth: '100%' }}
          >
            <ThemeScope scheme={scheme}>
              <View style={{ padding: SPACE.x4, gap: SPACE.x4, minWidth: 0, flexGrow: 1 }}>
                {children(scheme)}
              </View>
            </ThemeScope>
          </View>
        ))}
      </View>
    </View>
  );
}
