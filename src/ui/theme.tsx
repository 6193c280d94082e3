import {
  createContext,
  useCallback,
  useContext,
  useEffect,
  useMemo,
  useState,
  useSyncExternalStore,
} from 'react';
import type { CSSProperties, ReactNode } from 'react';
import { COLORS, FONTS } from './tokens';
import type { Colors, Scheme } from './tokens';
import { installPageStyle } from './page-style';

export type SchemePreference = 'light' | 'dark' | 'device';

export interface Theme {
  scheme: Scheme;
  colors: Colors;
  preference: SchemePreference;
  setPreference: (preference: SchemePreference) => void;
}

const PREFERENCE_KEY = 'appearance';
const DARK_QUERY = '(prefers-color-scheme: dark)';

const ThemeContext = createContext<Theme>({
  scheme: 'light',
  colors: COLORS.light,
  preference: 'device',
  setPreference: () => undefined,
});

export function useTheme(): Theme {
  return useContext(ThemeContext);
}

export function ThemeProvider({ children }: { children: ReactNode }) {
  const deviceScheme = useDeviceScheme();
  const [preference, setPreferenceState] = useState<SchemePreference>(readPreference);
  const scheme = preference === 'device' ? deviceScheme : preference;

  const setPreference = useCallback((next: SchemePreference) => {
    setPreferenceState(next);
    writePreference(next);
  }, []);

  const theme = useMemo<Theme>(
    () => ({ scheme, colors: COLORS[scheme], preference, setPreference }),
    [scheme, preference, setPreference],
  );

  useEffect(() => {
    installPageStyle();
  }, []);
  useEffect(() => {
    document.documentElement.style.colorScheme = scheme;
    document.body.style.backgroundColor = COLORS[scheme].ground;
  }, [scheme]);

  return (
    <ThemeContext.Provider value={theme}>
      <SchemeBox scheme={scheme} isWholePage>
        {children}
      </SchemeBox>
    </ThemeContext.Provider>
  );
}

/** Shows its children in one scheme whatever the rest of the page uses: the gallery, a print preview. */
export function ThemeScope({ scheme, children }: { scheme: Scheme; children: ReactNode }) {
  const outer = useTheme();
  const theme = useMemo<Theme>(() => ({ ...outer, scheme, colors: COLORS[scheme] }), [outer, scheme]);
  return (
    <ThemeContext.Provider value={theme}>
      <SchemeBox scheme={scheme}>{children}</SchemeBox>
    </ThemeContext.Provider>
  );
}

interface SchemeBoxProps {
  scheme: Scheme;
  isWholePage?: boolean;
  children: ReactNode;
}

/** The style sheet of the page (focus ring, placeholders, options) reads these variables. */
function SchemeBox({ scheme, isWholePage = false, children }: SchemeBoxProps) {
  const colors = COLORS[scheme];
  const style: CSSProperties & Record<`--${string}`, string> = {
    '--ink': colors.ink,
    '--ink-third': colors.inkThird,
    '--sheet': colors.sheet,
    '--ground': colors.ground,
    colorScheme: scheme,
    color: colors.ink,
    backgroundColor: colors.ground,
    fontFamily: FONTS.regular,
    display: 'flex',
    flexDirection: 'column',
    flexGrow: 1,
    minWidth: 0,
    minHeight: isWholePage ? '100dvh' : undefined,
  };
  return (
    <div data-scheme={scheme} style={style}>
      {children}
    </div>
  );
}

function useDeviceScheme(): Scheme {
  const isDark = useSyncExternalStore(subscribeToDevice, readDevice, () => false);
  return isDark ? 'dark' : 'light';
}

function subscribeToDevice(onChange: () => void): () => void {
  if (typeof window.matchMedia !== 'function') return () => undefined;
  const list = window.matchMedia(DARK_QUERY);
  list.addEventListener('change', onChange);
  return () => list.removeEventListener('change', onChange);
}

function readDevice(): boolean {
  return typeof window.matchMedia === 'function' && window.matchMedia(DARK_QUERY).matches;
}

// Storage can be closed (private windows, a full disk); the choice then lasts until the page is left.
function readPreference(): SchemePreference {
  try {
    const stored = window.localStorage.getItem(PREFERENCE_KEY);
    return stored === 'light' || stored === 'dark' ? stored : 'device';
  } catch {
    return 'device';
  }
}

function writePreference(preference: SchemePreference): void {
  try {
    window.localStorage.setItem(PREFERENCE_KEY, preference);
  } catch {
    return;
  }
}
