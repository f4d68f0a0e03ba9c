const numeral = /^[+-]?(\d+(\.\d*)?|\.\d+)([eE][+-]?\d+)?$/;

/** The number that was typed; null for nothing, undefined for something that is not a number. */
export function typedNumber(text: string): number | null | undefined {
  const trimmed = text.trim();
  if (trimmed === '') return null;
  const value = numeral.test(trimmed) ? Number(trimmed) : Number.NaN;
  return Number.isFinite(value) ? value : undefined;
}
