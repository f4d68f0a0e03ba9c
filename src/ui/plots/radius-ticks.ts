export type LogRange = readonly [number, number];

/** Ticks of a logarithmic axis in plain decimals: decades when wide, 1-2-5 when narrower, finer inside a decade. */
export function logTicks([from, to]: LogRange): { values: number[]; labels: string[] } {
  const values = steps(to - from).flatMap((mantissa) => decades(from, to).map((decade) => mantissa * 10 ** decade));
  const inside = values.filter((value) => Math.log10(value) >= from - 1e-9 && Math.log10(value) <= to + 1e-9);
  const sorted = inside.sort((a, b) => a - b).map((value) => Number(value.toPrecision(6)));
  return { values: sorted, labels: sorted.map(plain) };
}

function steps(width: number): number[] {
  if (width > 2.6) return [1];
  if (width > 1.2) return [1, 2, 5];
  if (width > 0.4) return [1, 1.5, 2, 3, 4, 5, 7];
  return Array.from({ length: 90 }, (_, index) => 1 + index / 10).filter(
    (_, index) => width <= 0.15 || index % 2 === 0,
  );
}

function decades(from: number, to: number): number[] {
  const first = Math.floor(from);
  return Array.from({ length: Math.floor(to) - first + 1 }, (_, index) => first + index);
}

function plain(value: number): string {
  return value >= 1e-3 && value < 1e5 ? String(value) : value.toExponential().replace('e', ' × 10^').replace('+', '');
}

/** The x range, as powers of ten, that a zoom with the pointer has asked for. */
export function axisRange(relayout: unknown): LogRange | null {
  const asked = relayout as Record<string, unknown> | null;
  const [from, to] = [asked?.['xaxis.range[0]'], asked?.['xaxis.range[1]']];
  return typeof from === 'number' && typeof to === 'number' && to > from ? [from, to] : null;
}
