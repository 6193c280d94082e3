import { createContext, useContext } from 'react';
import type { MouseEvent, ReactNode } from 'react';

/** How a link moves on inside the page. The router is given from outside, so that the parts need none of their own. */
export interface Navigation {
  go: (href: string) => void;
}

const NavigationContext = createContext<Navigation>({
  go: (href) => window.location.assign(href),
});

export function NavigationProvider({
  navigation,
  children,
}: {
  navigation: Navigation;
  children: ReactNode;
}) {
  return <NavigationContext.Provider value={navigation}>{children}</NavigationContext.Provider>;
}

function useNavigation(): Navigation {
  return useContext(NavigationContext);
}

/** For anchors: a plain click stays in the page; one that asks for a new tab or window is left to the browser. */
export function useAnchorClick(href: string, onFollow?: () => void) {
  const navigation = useNavigation();
  return (event: MouseEvent<HTMLElement>) => {
    if (event.defaultPrevented || !isPlainClick(event) || !href.startsWith('/')) return;
    event.preventDefault();
    onFollow?.();
    navigation.go(href);
  };
}

function isPlainClick(event: MouseEvent<HTMLElement>): boolean {
  return event.button === 0 && !event.metaKey && !event.ctrlKey && !event.shiftKey && !event.altKey;
}
