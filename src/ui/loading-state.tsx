import { useEffect, useState } from 'react';
import { View } from 'react-native';
import { Small } from './text';
import { useTheme } from './theme';
import { SPACE } from './tokens';

const SILENT_MS = 250;
const SLOW_MS = 2000;

export interface LoadingStateProps {
  /** What is awaited, as in 'Fetching the study'. */
  what: string;
  /** Held at one phase, for pictures; it follows the clock unless told. */
  heldPhase?: 'brief' | 'slow';
}

/** Nothing at first, since most answers come at once; then that something comes; after two seconds also what. */
export function LoadingState({ what, heldPhase }: LoadingStateProps) {
  const { colors } = useTheme();
  const [clockPhase, setPhase] = useState<'silent' | 'brief' | 'slow'>('silent');
  useEffect(() => {
    const toBrief = setTimeout(() => setPhase('brief'), SILENT_MS);
    const toSlow = setTimeout(() => setPhase('slow'), SLOW_MS);
    return () => {
      clearTimeout(toBrief);
      clearTimeout(toSlow);
    };
  }, []);
  const phase = heldPhase ?? clockPhase;
  return (
    <View role="status" aria-busy style={{ minHeight: 88, gap: SPACE.x2, paddingVertical: SPACE.x4 }}>
      {phase === 'silent' ? null : (
        <>
          <View aria-hidden style={{ flexDirection: 'row', alignItems: 'flex-end', gap: SPACE.x3 }}>
            {TICK_HEIGHTS_PX.map((heightPx, index) => (
              <View key={index} style={{ width: 1, height: heightPx, backgroundColor: colors.inkThird }} />
            ))}
          </View>
          <Small>
            {phase === 'slow' ? `${what}: it takes longer than usual. It goes on by itself.` : `${what}…`}
          </Small>
        </>
      )}
    </View>
  );
}

/** A ruler without numbers. */
const TICK_HEIGHTS_PX = [12, 6, 6, 6, 12, 6, 6, 6, 12];
