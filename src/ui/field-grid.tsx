import { Children } from 'react';
import type { ReactNode } from 'react';
import { View } from 'react-native';
import { SPACE } from './tokens';

/** Short fields beside one another, as many as fit; each at least as wide as its label needs. */
export function FieldGrid({ children, leastWidthPx = 128 }: { children: ReactNode; leastWidthPx?: number }) {
  return (
    <View
      style={{
        flexDirection: 'row',
        flexWrap: 'wrap',
        columnGap: SPACE.x3,
        rowGap: SPACE.x3,
        alignItems: 'flex-start',
      }}
    >
      {Children.toArray(children).map((child, index) => (
        <View key={index} style={{ flexGrow: 1, flexShrink: 1, flexBasis: leastWidthPx, minWidth: 0 }}>
          {child}
        </View>
      ))}
    </View>
  );
}
