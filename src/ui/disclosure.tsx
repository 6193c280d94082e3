import { useId, useState } from 'react';
import type { ReactNode } from 'react';
import { Pressable, View } from 'react-native';
import { Icon } from './icon';
import { Small } from './text';
import { useTheme } from './theme';
import { ROW_MIN_PX, SPACE } from './tokens';

export interface DisclosureProps {
  /** 'Table behind this chart' unless told. */
  label?: string;
  isOpenAtFirst?: boolean;
  children: ReactNode;
}

export function Disclosure({
  label = 'Table behind this chart',
  isOpenAtFirst = false,
  children,
}: DisclosureProps) {
  const { colors } = useTheme();
  const [isOpen, setIsOpen] = useState(isOpenAtFirst);
  const contentId = useId();
  return (
    <View style={{ gap: SPACE.x1, minWidth: 0 }}>
      <Pressable
        role="button"
        aria-expanded={isOpen}
        aria-controls={isOpen ? contentId : undefined}
        onPress={() => setIsOpen(!isOpen)}
        style={{
          minHeight: ROW_MIN_PX,
          flexDirection: 'row',
          alignItems: 'center',
          alignSelf: 'flex-start',
          gap: SPACE.x2,
        }}
      >
        <Icon name={isOpen ? 'open' : 'forward'} sizePx={12} color={colors.inkSecond} />
        <Small weight="medium">{label}</Small>
      </Pressable>
      {isOpen ? (
        <View id={contentId} style={{ minWidth: 0 }}>
          {children}
        </View>
      ) : null}
    </View>
  );
}
