import { useId } from 'react';
import type { KeyboardEvent } from 'react';
import { Pressable, Text, View } from 'react-native';
import { FieldError, fieldDescription } from './field';
import { Small, textStyle } from './text';
import { useTheme } from './theme';
import { HAIRLINE_PX, RADIUS_PX, ROW_MIN_PX, SIZES, SPACE, TITLE_LINE_HEIGHT } from './tokens';

export interface ChoiceOption {
  value: string;
  label: string;
}

export interface ChoiceProps {
  label: string;
  value: string;
  onChange: (value: string) => void;
  options: ChoiceOption[];
  hint?: string;
  error?: string;
  id?: string;
  /** Where the surroundings already say it; readers still hear it. */
  isLabelHidden?: boolean;
}

const STEP_BY_KEY: Partial<Record<string, number>> = {
  ArrowRight: 1,
  ArrowDown: 1,
  ArrowLeft: -1,
  ArrowUp: -1,
};

/** One of a few, all in sight: a radio group drawn as one ruled strip. */
export function Choice({
  label,
  value,
  onChange,
  options,
  hint,
  error,
  id,
  isLabelHidden = false,
}: ChoiceProps) {
  const { colors } = useTheme();
  const ownId = useId();
  const groupId = id ?? ownId;
  const chosenIndex = options.findIndex((option) => option.value === value);

  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    const step = STEP_BY_KEY[event.key];
    if (step === undefined) return;
    event.preventDefault();
    const nextIndex = (Math.max(chosenIndex, 0) + step + options.length) % options.length;
    const next = options[nextIndex];
    if (next === undefined) return;
    onChange(next.value);
    document.getElementById(`${groupId}-${nextIndex}`)?.focus();
  };

  return (
    <View style={{ gap: SPACE.x1 }}>
      {isLabelHidden ? null : (
        <Small id={`${groupId}-label`} tone="ink" weight="medium">
          {label}
        </Small>
      )}
      <View
        id={groupId}
        role="radiogroup"
        aria-label={isLabelHidden ? label : undefined}
        aria-labelledby={isLabelHidden ? undefined : `${groupId}-label`}
        aria-describedby={fieldDescription(groupId, { hint, error })}
        onKeyDown={onKeyDown}
        style={{
          flexDirection: 'row',
          flexWrap: 'wrap',
          borderWidth: HAIRLINE_PX,
          borderColor: colors.inkThird,
          borderRadius: RADIUS_PX,
          backgroundColor: colors.sheet,
          alignSelf: 'flex-start',
          maxWidth: '100%',
        }}
      >
        {options.map((option, index) => {
          const isChosen = option.value === value;
          const isTabStop = isChosen || (chosenIndex === -1 && index === 0);
          return (
            <Pressable
              key={option.value}
              id={`${groupId}-${index}`}
              role="radio"
              aria-checked={isChosen}
              tabIndex={isTabStop ? 0 : -1}
              onPress={() => onChange(option.value)}
              style={({ hovered, pressed }) => ({
                minHeight: ROW_MIN_PX,
                flexGrow: 1,
                justifyContent: 'center',
                paddingHorizontal: SPACE.x3,
                borderLeftWidth: index === 0 ? 0 : HAIRLINE_PX,
                borderColor: colors.line,
                backgroundColor: isChosen
                  ? colors.ink
                  : hovered || pressed
                    ? colors.lineFaint
                    : 'transparent',
              })}
            >
              <Text
                style={[
                  textStyle(isChosen ? 'medium' : 'regular', SIZES.body, TITLE_LINE_HEIGHT),
                  { color: isChosen ? colors.sheet : colors.ink, textAlign: 'center' },
                ]}
              >
                {option.label}
              </Text>
            </Pressable>
          );
        })}
      </View>
      {hint === undefined ? null : <Small id={`${groupId}-hint`}>{hint}</Small>}
      <FieldError id={groupId} error={error} />
    </View>
  );
}
