import type { ReactNode } from 'react';
import { View } from 'react-native';
import type { ViewStyle } from 'react-native';
import { SPACE } from './tokens';

export type Gap = keyof typeof SPACE;

export interface StackProps {
  children: ReactNode;
  gap?: Gap;
  align?: ViewStyle['alignItems'];
  role?: 'list' | 'group' | 'region';
  label?: string;
}

/** Things below one another. */
export function Stack({ children, gap = 'x4', align, role, label }: StackProps) {
  return (
    <View role={role} aria-label={label} style={{ gap: SPACE[gap], alignItems: align, minWidth: 0 }}>
      {children}
    </View>
  );
}

export interface InlineProps {
  children: ReactNode;
  gap?: Gap;
  align?: ViewStyle['alignItems'];
  justify?: ViewStyle['justifyContent'];
  isWrapping?: boolean;
}

/** Things beside one another, on to a next line where they do not fit. */
export function Inline({ children, gap = 'x2', align = 'center', justify, isWrapping = true }: InlineProps) {
  return (
    <View
      style={{
        flexDirection: 'row',
        flexWrap: isWrapping ? 'wrap' : 'nowrap',
        columnGap: SPACE[gap],
        rowGap: SPACE.x2,
        alignItems: align,
        justifyContent: justify,
        minWidth: 0,
      }}
    >
      {children}
    </View>
  );
}
