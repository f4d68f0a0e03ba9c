import { describe, expect, it } from 'vitest';
import { exactText, percentInterval, percentText, radiusText, trimmed } from '@/src/ui/run-figures';

const breakable = (text: string) => text.replaceAll('\u00a0', ' ');

describe('numbers on screen', () => {
  it.each([
    [0, '0'],
    [1, '1.000'],
    [-2.5, '-2.500'],
    [0.57044, '0.5704'],
    [12344, '12340'],
    [1234.5, '1235'],
    [0.001, '0.001000'],
  ])('%d is shown with four figures as %s', (value, text) => expect(trimmed(value, 4)).toBe(text));

  it.each([
    [0.000123, '1.230 × 10⁻⁴'],
    [-0.000123, '-1.230 × 10⁻⁴'],
    [100000, '1.000 × 10⁵'],
    [6.02214e23, '6.022 × 10²³'],
  ])('%d, below 1e-3 or from 1e5 on, is a power of ten: %s', (value, text) => expect(trimmed(value, 4)).toBe(text));

  it('takes the power that is right after rounding', () => {
    expect(trimmed(0.00099999, 4)).toBe('0.001000');
    expect(trimmed(99999.9, 4)).toBe('1.000 × 10⁵');
  });

  it.each([
    [2.5, '2.5'],
    [3, '3'],
    [100, '100'],
    [0.45, '0.45'],
    [1.3271244e20, '1.3271244 × 10²⁰'],
    [3.828e26, '3.828 × 10²⁶'],
    [2e-7, '2 × 10⁻⁷'],
  ])('%d that somebody chose has no zeros added: %s', (value, text) => expect(exactText(value, 12)).toBe(text));
});

describe('shares', () => {
  it.each([
    [0, 'none'],
    [1, '100 %'],
    [0.34, '34.0 %'],
    [0.99999, 'more than 99.9 %'],
    [1e-6, 'less than 0.001 %'],
    [0.000448, '0.0448 %'],
  ])('%d reads %s', (share, text) => expect(breakable(percentText(share))).toBe(text));

  it('an interval has the decimals that its width can bear', () => {
    expect(breakable(percentInterval([0.2953, 0.3877]))).toBe('29.5–38.8 %');
    expect(breakable(percentInterval([0.76812, 0.80651]))).toBe('76.8–80.7 %');
    expect(breakable(percentInterval([0.1, 0.6]))).toBe('10–60 %');
    expect(breakable(percentInterval([0, 0]))).toBe('0.00 %');
  });
});

it('a radius stays together with its unit', () => expect(radiusText(0.5704)).toBe('0.570\u00a0µm'));
