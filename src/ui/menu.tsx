import { useEffect, useId, useRef, useState } from 'react';
import type { KeyboardEvent } from 'react';
import { Pressable, View } from 'react-native';
import { Icon } from './icon';
import type { IconName } from './icon';
import { Body } from './text';
import { useTheme } from './theme';
import { HAIRLINE_PX, ROW_MIN_PX, SPACE } from './tokens';

export interface MenuItem {
  label: string;
  onPress: () => void;
  icon?: IconName;
}

export interface MenuProps {
  /** 'More about EVOH 5' */
  label: string;
  items: MenuItem[];
  icon?: IconName;
}

/** A button that opens a short list of actions; arrows walk it, Escape closes it and focus returns. */
export function Menu({ label, items, icon = 'more' }: MenuProps) {
  const { colors } = useTheme();
  const [isOpen, setIsOpen] = useState(false);
  const menuId = useId();
  const boxRef = useRef<HTMLDivElement>(null);
  const itemId = (index: number) => `${menuId}-${index}`;

  useEffect(() => {
    if (!isOpen) return;
    document.getElementById(`${menuId}-0`)?.focus();
    const onPointerDown = (event: PointerEvent) => {
      const isInside = event.target instanceof Node && boxRef.current?.contains(event.target) === true;
      if (!isInside) setIsOpen(false);
    };
    document.addEventListener('pointerdown', onPointerDown);
    return () => document.removeEventListener('pointerdown', onPointerDown);
  }, [isOpen, menuId]);

  const close = () => {
    setIsOpen(false);
    document.getElementById(`${menuId}-opener`)?.focus();
  };

  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    if (!isOpen) return;
    if (event.key === 'Escape' || event.key === 'Tab') {
      if (event.key === 'Escape') event.preventDefault();
      close();
      return;
    }
    const current = items.findIndex((_, index) => document.activeElement?.id === itemId(index));
    const next = nextIndex(event.key, current, items.length);
    if (next === undefined) return;
    event.preventDefault();
    document.getElementById(itemId(next))?.focus();
  };

  return (
    <div ref={boxRef} style={{ position: 'relative', display: 'inline-flex' }} onKeyDown={onKeyDown}>
      <Pressable
        id={`${menuId}-opener`}
        role="button"
        aria-label={label}
        aria-haspopup="menu"
        aria-expanded={isOpen}
        onPress={() => setIsOpen(!isOpen)}
        style={({ hovered, pressed }) => ({
          width: ROW_MIN_PX,
          height: ROW_MIN_PX,
          alignItems: 'center',
          justifyContent: 'center',
          backgroundColor: hovered || pressed || isOpen ? colors.lineFaint : 'transparent',
        })}
      >
        <Icon name={icon} />
      </Pressable>
      {isOpen ? (
        <View
          role="menu"
          aria-label={label}
          style={{
            position: 'absolute',
            top: ROW_MIN_PX,
            right: 0,
            zIndex: 10,
            minWidth: 200,
            borderWidth: HAIRLINE_PX,
            borderColor: colors.ink,
            backgroundColor: colors.sheet,
          }}
        >
          {items.map((item, index) => (
            <Pressable
              key={item.label}
              id={itemId(index)}
              role="menuitem"
              tabIndex={-1}
              onPress={() => {
                close();
                item.onPress();
              }}
              style={({ hovered, pressed }) => ({
                minHeight: ROW_MIN_PX,
                flexDirection: 'row',
                alignItems: 'center',
                gap: SPACE.x3,
                paddingHorizontal: SPACE.x3,
                borderTopWidth: index === 0 ? 0 : HAIRLINE_PX,
                borderTopColor: colors.lineFaint,
                backgroundColor: hovered || pressed ? colors.lineFaint : 'transparent',
              })}
            >
              {item.icon === undefined ? null : <Icon name={item.icon} sizePx={16} />}
              <Body>{item.label}</Body>
            </Pressable>
          ))}
        </View>
      ) : null}
    </div>
  );
}

function nextIndex(key: string, current: number, count: number): number | undefined {
  if (key === 'ArrowDown') return (current + 1) % count;
  if (key === 'ArrowUp') return (current - 1 + count) % count;
  if (key === 'Home') return 0;
  if (key === 'End') return count - 1;
  return undefined;
}
