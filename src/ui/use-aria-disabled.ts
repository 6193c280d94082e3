import { useEffect, useRef } from 'react';
import type { View } from 'react-native';

/**
 * Marks a button as disabled for readers and leaves the focus on it. react-native-web turns its own aria-disabled into
 * the page's `disabled`, which throws a keyboard's place away at the very moment when saving begins or a layer reaches
 * the top.
 */
export function useAriaDisabled(isDisabled: boolean) {
  const ref = useRef<View>(null);
  useEffect(() => {
    const element: unknown = ref.current;
    if (!(element instanceof HTMLElement)) return;
    if (isDisabled) element.setAttribute('aria-disabled', 'true');
    else element.removeAttribute('aria-disabled');
  }, [isDisabled]);
  return ref;
}
