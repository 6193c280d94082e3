import { useEffect, useId, useRef } from 'react';
import type { ReactNode } from 'react';
import { View } from 'react-native';
import { IconButton } from './icon-button';
import { Heading } from './text';
import { useTheme } from './theme';
import { HAIRLINE_PX, SPACE } from './tokens';

export interface DialogProps {
  title: string;
  isOpen: boolean;
  onClose: () => void;
  /** Buttons at its foot, the safe one first. */
  actions?: ReactNode;
  children: ReactNode;
}

/** The browser's own modal dialog: it traps focus, closes with Escape and gives focus back to what opened it. */
export function Dialog({ title, isOpen, onClose, actions, children }: DialogProps) {
  const { colors } = useTheme();
  const dialogRef = useRef<HTMLDialogElement>(null);
  const titleId = useId();

  useEffect(() => {
    const dialog = dialogRef.current;
    if (!isOpen || dialog === null) return;
    const opener = document.activeElement;
    dialog.showModal();
    return () => {
      dialog.close();
      if (opener instanceof HTMLElement) opener.focus();
    };
  }, [isOpen]);

  if (!isOpen) return null;
  return (
    <dialog
      ref={dialogRef}
      aria-labelledby={titleId}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      onClick={(event) => {
        // The dialog's own box is filled by its content; a click on the element itself fell on the backdrop.
        if (event.target === dialogRef.current) onClose();
      }}
      style={{
        width: 'min(520px, calc(100vw - 32px))',
        maxHeight: 'calc(100dvh - 32px)',
        padding: 0,
        border: `${HAIRLINE_PX}px solid ${colors.ink}`,
        borderRadius: 2,
        backgroundColor: colors.sheet,
        color: colors.ink,
      }}
    >
      <View style={{ padding: SPACE.x4, gap: SPACE.x3 }}>
        <View
          style={{
            flexDirection: 'row',
            justifyContent: 'space-between',
            alignItems: 'center',
            gap: SPACE.x3,
          }}
        >
          <View style={{ flexShrink: 1 }}>
            <Heading id={titleId}>{title}</Heading>
          </View>
          <IconButton icon="remove" label="Close" onPress={onClose} />
        </View>
        {children}
        {actions === undefined ? null : (
          <View style={{ flexDirection: 'row', flexWrap: 'wrap', gap: SPACE.x2, justifyContent: 'flex-end' }}>
            {actions}
          </View>
        )}
      </View>
    </dialog>
  );
}
