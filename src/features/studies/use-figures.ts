import { useMemo } from 'react';
import {
  displayUnit,
  formatExact,
  formatNumber,
  formatQuantity,
  toDisplay,
  type DisplayKindName,
  type DisplayUnitSystem,
} from '../../../shared/units/format';
import { useUnitSystem } from '../../session';

export interface Figures {
  unitSystem: DisplayUnitSystem;
  /** Figures and unit, three significant. */
  text: (value: number, kind: DisplayKindName) => string;
  /** As given, no zeros added: gauges, conditions, limits. */
  exact: (value: number, kind: DisplayKindName) => string;
  /** Figures alone, where the unit stands in the head of a table. */
  figures: (value: number, kind: DisplayKindName) => string;
  unit: (kind: DisplayKindName) => string;
  /** The number in the unit shown, for charts. */
  shown: (value: number, kind: DisplayKindName) => number;
  /** A number already in the unit shown, as a round tick. */
  tick: (shown: number) => string;
  percent: (fraction: number) => string;
}

/** Every figure of the study screens, in the person's units. */
export function useFigures(): Figures {
  const unitSystem = useUnitSystem();
  return useMemo(() => figuresIn(unitSystem), [unitSystem]);
}

export function figuresIn(unitSystem: DisplayUnitSystem): Figures {
  return {
    unitSystem,
    text: (value, kind) => formatQuantity(value, kind, { unitSystem }).text,
    exact: (value, kind) => formatQuantity(value, kind, { unitSystem, isExact: true }).text,
    figures: (value, kind) => formatQuantity(value, kind, { unitSystem }).figures,
    unit: (kind) => displayUnit(kind, unitSystem).unit,
    shown: (value, kind) => toDisplay(value, kind, unitSystem),
    tick: (shown) => formatExact(shown),
    percent: (fraction) => `${formatNumber(fraction * 100)}\u00a0%`,
  };
}
