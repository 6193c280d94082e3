import { useCallback, useSyncExternalStore } from 'react';
import { WIDE_FROM_PX } from './tokens';

/** True from the width where a side rail and panes stand side by side. */
export function useIsWide(): boolean {
  return useIsAtLeast(WIDE_FROM_PX);
}

export function useIsAtLeast(widthPx: number): boolean {
  const query = `(min-width: ${widthPx}px)`;
  const subscribe = useCallback(
    (onChange: () => void) => {
      if (typeof window.matchMedia !== 'function') return () => undefined;
      const list = window.matchMedia(query);
      list.addEventListener('change', onChange);
      return () => list.removeEventListener('change', onChange);
    },
    [query],
  );
  const read = () => typeof window.matchMedia === 'function' && window.matchMedia(query).matches;
  return useSyncExternalStore(subscribe, read, () => false);
}
