import type { ReactNode } from 'react';
import { View } from 'react-native';
import { Small } from './text';
import { useTheme } from './theme';
import { FONTS, SIZES, SPACE } from './tokens';

export interface FieldProps {
  /** Id of the control; hint and error hang on it. */
  id: string;
  label: string;
  hint?: string;
  error?: string;
  /** Said beside the label: 'optional'. What is not marked is needed. */
  note?: string;
  children: ReactNode;
}

/** Label above, control, then hint and fault below it. A fault is told by its edge and its words. */
export function Field({ id, label, hint, error, note, children }: FieldProps) {
  const { colors } = useTheme();
  return (
    <View style={{ gap: SPACE.x1, minWidth: 0 }}>
      <label htmlFor={id} style={{ fontFamily: FONTS.medium, fontSize: SIZES.small, color: colors.ink }}>
        {label}
        {note === undefined ? null : (
          <span style={{ fontFamily: FONTS.regular, color: colors.inkThird }}>{` · ${note}`}</span>
        )}
      </label>
      {children}
      {hint === undefined || hint === '' ? null : <Small id={`${id}-hint`}>{hint}</Small>}
      <FieldError id={id} error={error} />
    </View>
  );
}

export function FieldError({ id, error }: { id: string; error: string | undefined }) {
  const { colors } = useTheme();
  if (error === undefined || error === '') return null;
  return (
    <View style={{ borderLeftWidth: 3, borderLeftColor: colors.ink, paddingLeft: SPACE.x2 }}>
      <Small id={`${id}-error`} tone="ink" weight="medium">
        {error}
      </Small>
    </View>
  );
}

/** What the control's aria-describedby names. */
export function fieldDescription(id: string, parts: { hint?: string; error?: string }): string | undefined {
  const ids = [
    parts.error !== undefined && parts.error !== '' ? `${id}-error` : '',
    parts.hint !== undefined && parts.hint !== '' ? `${id}-hint` : '',
  ].filter((part) => part !== '');
  return ids.length === 0 ? undefined : ids.join(' ');
}
