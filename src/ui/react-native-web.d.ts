/// <reference types="expo/types" />
import type { KeyboardEvent, MouseEvent } from 'react';
import 'react-native';

/** What react-native-web passes on to the page and react-native's own types do not know. */
interface WebProps {
  'aria-controls'?: string;
  'aria-current'?: 'page' | 'step' | 'true';
  'aria-describedby'?: string;
  'aria-haspopup'?: 'menu' | 'dialog' | 'listbox';
  'aria-invalid'?: boolean;
  'aria-level'?: number;
  'aria-pressed'?: boolean;
  'aria-required'?: boolean;
  href?: string;
  onClick?: (event: MouseEvent<HTMLElement>) => void;
  onKeyDown?: (event: KeyboardEvent<HTMLElement>) => void;
}

declare module 'react-native' {
  // eslint-disable-next-line @typescript-eslint/no-empty-object-type
  interface ViewProps extends WebProps {}
  // eslint-disable-next-line @typescript-eslint/no-empty-object-type
  interface TextProps extends WebProps {}
  interface TextStyle {
    overflowWrap?: 'normal' | 'break-word' | 'anywhere';
  }
}
