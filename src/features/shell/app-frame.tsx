import { QueryClientProvider } from '@tanstack/react-query';
import { useRouter } from 'expo-router';
import type { Href } from 'expo-router';
import { useMemo, useState } from 'react';
import type { ReactNode } from 'react';
import { createQueryClient } from '../../api/query-client';
import { SessionProvider } from '../../session';
import { NavigationProvider, PageTitleProvider, ThemeProvider } from '../../ui';
import { useFontsSettled } from '../../ui/fonts';

/** Everything that every screen stands in. */
export function AppFrame({ children }: { children: ReactNode }) {
  const [queryClient] = useState(createQueryClient);
  const router = useRouter();
  const navigation = useMemo(() => ({ go: (href: string) => router.push(href as Href) }), [router]);
  const areFontsSettled = useFontsSettled();
  return (
    <QueryClientProvider client={queryClient}>
      <ThemeProvider>
        <PageTitleProvider suffix="Larderline">
          <NavigationProvider navigation={navigation}>
            <SessionProvider>{areFontsSettled ? children : null}</SessionProvider>
          </NavigationProvider>
        </PageTitleProvider>
      </ThemeProvider>
    </QueryClientProvider>
  );
}
