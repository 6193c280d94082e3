import { View } from 'react-native';
import { Small } from './text';

export interface StatusLineProps {
  /** Empty while there is nothing to say; the line keeps its place so that nothing jumps. */
  message: string;
}

/** What just happened, in its own place on the page, read out politely. */
export function StatusLine({ message }: StatusLineProps) {
  return (
    <View role="status" aria-live="polite" style={{ minHeight: 20 }}>
      {message === '' ? null : <Small>{message}</Small>}
    </View>
  );
}
