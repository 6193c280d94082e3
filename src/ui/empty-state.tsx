import type { ReactNode } from 'react';
import { View } from 'react-native';
import { Body, Heading } from './text';
import { useTheme } from './theme';
import { HAIRLINE_PX, SPACE } from './tokens';

export interface EmptyStateProps {
  title: string;
  /** What will stand here, and how it comes. */
  children: ReactNode;
  action?: ReactNode;
}

export function EmptyState({ title, children, action }: EmptyStateProps) {
  const { colors } = useTheme();
  return (
    <View
      style={{
        borderWidth: HAIRLINE_PX,
        borderStyle: 'dashed',
        borderColor: colors.inkThird,
        padding: SPACE.x5,
        gap: SPACE.x2,
        alignItems: 'flex-start',
      }}
    >
      <Heading>{title}</Heading>
      {typeof children === 'string' ? <Body tone="second">{children}</Body> : children}
      {action === undefined ? null : <View style={{ paddingTop: SPACE.x2 }}>{action}</View>}
    </View>
  );
}
