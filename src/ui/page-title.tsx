import { createContext, useContext, useEffect } from 'react';
import type { ReactNode } from 'react';

const SuffixContext = createContext('');

export function PageTitleProvider({ suffix, children }: { suffix: string; children: ReactNode }) {
  return <SuffixContext.Provider value={suffix}>{children}</SuffixContext.Provider>;
}

/** Names the browser's tab and its history entry. */
export function usePageTitle(title: string): void {
  const suffix = useContext(SuffixContext);
  useEffect(() => {
    document.title = suffix === '' || suffix === title ? title : `${title} · ${suffix}`;
  }, [title, suffix]);
}
