import { Pressable, Text, View } from 'react-native';
import type { ViewStyle } from 'react-native';
import { Icon } from './icon';
import type { IconName } from './icon';
import { useAnchorClick } from './navigation';
import { textStyle } from './text';
import { useTheme } from './theme';
import { HAIRLINE_PX, RADIUS_PX, ROW_MIN_PX, SIZES, SPACE, TITLE_LINE_HEIGHT } from './tokens';
import type { Colors } from './tokens';
import { useAriaDisabled } from './use-aria-disabled';

export type ButtonKind = 'primary' | 'secondary' | 'quiet';

export interface ButtonProps {
  label: string;
  onPress: () => void;
  kind?: ButtonKind;
  icon?: IconName;
  /** While true a press does nothing and readers hear that it is busy. */
  isBusy?: boolean;
  /** Shown instead of the label while busy: 'Saving…'. */
  busyLabel?: string;
  /** Why it cannot be pressed now is said beside it, never by greying alone. */
  isDisabled?: boolean;
  /** Where the label alone does not say on what: 'Fill in the engineer'. It begins with the label's own words. */
  accessibleLabel?: string;
}

export function Button(props: ButtonProps) {
  const { label, onPress, kind = 'secondary', icon, isBusy = false, busyLabel, isDisabled = false } = props;
  const { colors } = useTheme();
  const isIdle = !isBusy && !isDisabled;
  const ref = useAriaDisabled(!isIdle);
  return (
    <Pressable
      ref={ref}
      role="button"
      aria-busy={isBusy}
      aria-label={props.accessibleLabel}
      onPress={isIdle ? onPress : undefined}
      style={({ pressed, hovered }) =>
        buttonStyle(colors, kind, { isActive: (pressed || hovered) && isIdle, isDisabled })
      }
    >
      <ButtonContent label={isBusy ? (busyLabel ?? label) : label} kind={kind} icon={icon} />
    </Pressable>
  );
}

export interface LinkButtonProps {
  href: string;
  label: string;
  kind?: ButtonKind;
  icon?: IconName;
}

/** Looks like a button, is a link: it goes somewhere and has an address. */
export function LinkButton({ href, label, kind = 'secondary', icon }: LinkButtonProps) {
  const { colors } = useTheme();
  const onClick = useAnchorClick(href);
  return (
    <View
      href={href}
      onClick={onClick}
      style={[buttonStyle(colors, kind, { isActive: false, isDisabled: false })]}
    >
      <ButtonContent label={label} kind={kind} icon={icon} />
    </View>
  );
}

function ButtonContent({ label, kind, icon }: { label: string; kind: ButtonKind; icon?: IconName }) {
  const { colors } = useTheme();
  const color = kind === 'primary' ? colors.sheet : colors.ink;
  return (
    <>
      {icon === undefined ? null : <Icon name={icon} sizePx={16} color={color} />}
      <Text
        style={[
          textStyle('medium', SIZES.heading, TITLE_LINE_HEIGHT),
          { color, textAlign: 'center', flexShrink: 1 },
        ]}
      >
        {label}
      </Text>
    </>
  );
}

function buttonStyle(
  colors: Colors,
  kind: ButtonKind,
  state: { isActive: boolean; isDisabled: boolean },
): ViewStyle {
  const isFilled = kind === 'primary';
  const idleFill = isFilled ? colors.ink : 'transparent';
  const activeFill = isFilled ? colors.inkSecond : colors.lineFaint;
  return {
    minHeight: ROW_MIN_PX,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: SPACE.x2,
    paddingHorizontal: kind === 'quiet' ? SPACE.x2 : SPACE.x4,
    paddingVertical: SPACE.x2,
    borderRadius: RADIUS_PX,
    borderWidth: HAIRLINE_PX,
    borderStyle: state.isDisabled ? 'dashed' : 'solid',
    borderColor: kind === 'quiet' && !state.isDisabled ? 'transparent' : colors.ink,
    backgroundColor: state.isActive ? activeFill : idleFill,
    cursor: state.isDisabled ? 'auto' : 'pointer',
  };
}
