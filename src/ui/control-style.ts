import type { CSSProperties } from 'react';
import { FONTS, HAIRLINE_PX, RADIUS_PX, ROW_MIN_PX, SIZES, SPACE } from './tokens';
import type { Colors } from './tokens';

/** The box one types into: a hairline in third ink, a full ink frame when something is wrong. */
export function controlStyle(colors: Colors, state: { hasError: boolean; isFigure: boolean }): CSSProperties {
  return {
    boxSizing: 'border-box',
    width: '100%',
    minWidth: 0,
    minHeight: ROW_MIN_PX,
    margin: 0,
    paddingTop: SPACE.x2,
    paddingBottom: SPACE.x2,
    paddingLeft: SPACE.x3,
    paddingRight: SPACE.x3,
    borderStyle: 'solid',
    borderWidth: state.hasError ? 2 : HAIRLINE_PX,
    borderColor: state.hasError ? colors.ink : colors.inkThird,
    borderRadius: RADIUS_PX,
    backgroundColor: colors.sheet,
    color: colors.ink,
    fontFamily: state.isFigure ? FONTS.mono : FONTS.regular,
    fontSize: SIZES.heading,
    fontVariantNumeric: state.isFigure ? 'tabular-nums' : undefined,
    lineHeight: 1.2,
  };
}
