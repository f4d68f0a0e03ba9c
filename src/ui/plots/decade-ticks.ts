const raised = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** Ticks at the powers of ten, written with raised digits: Plotly's own markup would need inline styles. */
export function decadeTicks([from, to]: readonly [number, number]): {
  tickmode: 'array';
  tickvals: number[];
  ticktext: string[];
} {
  const first = Math.ceil(from);
  const powers = Array.from({ length: Math.max(0, Math.floor(to) - first + 1) }, (_, index) => first + index);
  return { tickmode: 'array', tickvals: powers.map((power) => 10 ** power), ticktext: powers.map(powerText) };
}

function powerText(power: number): string {
  if (power >= -2 && power <= 2) return String(10 ** power);
  const digits = [...String(Math.abs(power))].map((digit) => raised[Number(digit)]).join('');
  return `10${power < 0 ? '⁻' : ''}${digits}`;
}
