import { Pressable } from 'react-native';
import { Icon } from './icon';
import type { IconName } from './icon';
import { useTheme } from './theme';
import { RADIUS_PX, ROW_MIN_PX } from './tokens';
import { useAriaDisabled } from './use-aria-disabled';

export interface IconButtonProps {
  icon: IconName;
  /** What it does, on what: 'Move EVOH 5 outwards'. */
  label: string;
  onPress: () => void;
  isDisabled?: boolean;
  isPressed?: boolean;
}

export function IconButton({ icon, label, onPress, isDisabled = false, isPressed }: IconButtonProps) {
  const { colors } = useTheme();
  const ref = useAriaDisabled(isDisabled);
  return (
    <Pressable
      ref={ref}
      role="button"
      aria-label={label}
      aria-pressed={isPressed}
      onPress={isDisabled ? undefined : onPress}
      style={({ pressed, hovered }) => ({
        width: ROW_MIN_PX,
        height: ROW_MIN_PX,
        alignItems: 'center',
        justifyContent: 'center',
        borderRadius: RADIUS_PX,
        backgroundColor:
          (pressed || hovered || isPressed === true) && !isDisabled ? colors.lineFaint : 'transparent',
        cursor: isDisabled ? 'auto' : 'pointer',
      })}
    >
      <Icon name={icon} color={isDisabled ? colors.line : colors.ink} />
    </Pressable>
  );
}
