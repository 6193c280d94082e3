import { useState } from 'react';
import { Pressable } from 'react-native';
import { Figure, ROW_MIN_PX, Small } from '../../../ui';

export interface MeasurableProps {
  figures: string;
  unit?: string;
  isBelowMeasurable: boolean;
  size?: 'small' | 'body';
}

/** cm³ or g per m² and day: about the least that laboratories can measure. */
const SMALLEST_MEASURABLE_RATE = 0.005;

export function isBelowMeasurable(ratePerM2Day: number): boolean {
  return Math.abs(ratePerM2Day) < SMALLEST_MEASURABLE_RATE;
}

/** A rate; below what laboratories can measure it says so, and shows the figure on demand. */
export function Measurable({ figures, unit, isBelowMeasurable, size = 'small' }: MeasurableProps) {
  const [isShown, setIsShown] = useState(false);
  if (!isBelowMeasurable)
    return <Figure value={figures} unit={unit} size={size} isStrong={size === 'body'} />;
  return (
    <Pressable
      role="button"
      aria-expanded={isShown}
      onPress={() => setIsShown(!isShown)}
      style={{ minHeight: ROW_MIN_PX, justifyContent: 'center', alignItems: 'flex-end' }}
    >
      <Small tone="ink" align="right">
        below what labs can measure
      </Small>
      {isShown ? (
        <Figure value={figures} unit={unit} size="small" />
      ) : (
        <Small align="right">show the figure</Small>
      )}
    </Pressable>
  );
}
