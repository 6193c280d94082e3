import { describe, expect, it } from 'vitest';
import { parseTypedNumber, stepTypedNumber } from './typed-number';

describe('parseTypedNumber', () => {
  it.each([
    ['12', 12],
    ['12.5', 12.5],
    ['12,5', 12.5],
    [' 1 000 ', 1000],
    ['1\u202F000,5', 1000.5],
    ['.5', 0.5],
    ['5.', 5],
    ['-3', -3],
    ['\u22123', -3],
    ['1e-6', 1e-6],
    ['2,5E3', 2500],
  ])('reads %j as %d', (text, number) => {
    expect(parseTypedNumber(text)).toBe(number);
  });

  it.each(['', '   '])('finds nothing in %j', (text) => {
    expect(parseTypedNumber(text)).toBeUndefined();
  });

  it.each(['abc', '12 µm', '1,234.5', '1.2.3', '--1', 'Infinity', 'NaN', '0x10', '.', '-'])(
    'does not guess at %j',
    (text) => {
      expect(parseTypedNumber(text)).toBeNaN();
    },
  );
});

describe('stepTypedNumber', () => {
  it('leaves no dust of binary fractions', () => {
    expect(stepTypedNumber('0.1', 0.2)).toBe('0.3');
  });
  it('keeps the decimal comma', () => {
    expect(stepTypedNumber('12,5', 1)).toBe('13,5');
  });
  it('stops at the bounds', () => {
    expect(stepTypedNumber('7', -5, { min: 5 })).toBe('5');
    expect(stepTypedNumber('1999', 5, { max: 2000 })).toBe('2000');
  });
  it('leaves alone what is no number', () => {
    expect(stepTypedNumber('twelve', 1)).toBe('twelve');
  });
});
