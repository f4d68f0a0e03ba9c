/** A share as people read it: three figures, and never 0 or 100 per cent when some are left on the other side. */
export function percentText(share: number): string {
  if (share === 0) return 'none';
  if (share === 1) return '100\u00a0%';
  const percent = share * 100;
  if (percent < 0.001) return 'less than 0.001\u00a0%';
  const text = trimmed(percent);
  return text === '100' ? 'more than 99.9\u00a0%' : `${text}\u00a0%`;
}

/** Two shares as an interval, with as many decimals as its width can bear. */
export function percentInterval([low, high]: readonly [number, number]): string {
  const width = (high - low) * 100;
  const decimals = width > 0 ? Math.min(4, Math.max(0, 1 - Math.floor(Math.log10(width)))) : 2;
  const [from, to] = [low, high].map((share) => (share * 100).toFixed(decimals));
  return from === to ? `${from}\u00a0%` : `${from}–${to}\u00a0%`;
}

/** A radius inside a sentence, three figures. */
export function radiusText(radiusUm: number): string {
  return `${trimmed(radiusUm)}\u00a0µm`;
}

export function trimmed(value: number, digits = 3): string {
  const rounded = Number(value.toPrecision(digits));
  if (rounded === 0) return '0';
  if (Math.abs(rounded) < 1e-3 || Math.abs(rounded) >= 1e5) return powerOfTen(rounded, digits);
  return Math.abs(rounded) >= 10 ** digits ? String(rounded) : rounded.toPrecision(digits);
}

/** A number that somebody chose, without zeros that nobody wrote. */
export function exactText(value: number, digits = 6): string {
  return trimmed(value, digits)
    .replace(/(\.\d*?)0+(?=$| )/, '$1')
    .replace(/\.(?=$| )/, '');
}

const raised: Record<string, string> = {
  '-': '⁻',
  '0': '⁰',
  '1': '¹',
  '2': '²',
  '3': '³',
  '4': '⁴',
  '5': '⁵',
  '6': '⁶',
  '7': '⁷',
  '8': '⁸',
  '9': '⁹',
};

function powerOfTen(value: number, digits: number): string {
  const [mantissa, exponent] = value.toExponential(digits - 1).split('e');
  return `${mantissa} × 10${[...String(Number(exponent))].map((sign) => raised[sign]).join('')}`;
}
