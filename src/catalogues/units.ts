export type Quantity = 'length' | 'mass' | 'density';

/** SI value = value * times / over. Both are whole numbers below 2^53 or powers of ten up to 1e22, so the factor itself is exact. */
export type Unit = { symbol: string; quantity: Quantity; times: number; over: number; spellings: readonly string[] };

const unit = (quantity: Quantity, symbol: string, times: number, over: number, ...spellings: string[]): Unit => ({
  symbol,
  quantity,
  times,
  over,
  spellings: [squeeze(symbol), ...spellings],
});

export const units: readonly Unit[] = [
  unit('length', 'nm', 1, 1e9, 'nanometre', 'nanometres', 'nanometer', 'nanometers'),
  unit('length', 'um', 1, 1e6, 'micron', 'microns', 'micrometre', 'micrometres', 'micrometer', 'micrometers'),
  unit('length', 'mm', 1, 1e3, 'millimetre', 'millimetres', 'millimeter', 'millimeters'),
  unit('length', 'cm', 1, 1e2, 'centimetre', 'centimetres', 'centimeter', 'centimeters'),
  unit('length', 'm', 1, 1, 'metre', 'metres', 'meter', 'meters'),
  unit('mass', 'kg', 1, 1, 'kilogram', 'kilograms'),
  unit('mass', 'g', 1, 1e3, 'gram', 'grams'),
  unit('mass', 'mg', 1, 1e6, 'milligram', 'milligrams'),
  unit('mass', 'ug', 1, 1e9, 'microgram', 'micrograms'),
  unit('mass', 'ng', 1, 1e12, 'nanogram', 'nanograms'),
  unit('mass', 'pg', 1, 1e15, 'picogram', 'picograms'),
  unit('mass', 'fg', 1, 1e18, 'femtogram', 'femtograms'),
  unit('mass', 'ag', 1, 1e21, 'attogram', 'attograms'),
  unit('density', 'g_cm3', 1000, 1, 'g/cm3', 'gcm-3', 'g/cc', 'gcc', 'g/ccm'),
  unit('density', 'kg_m3', 1, 1, 'kg/m3', 'kgm-3'),
];

/** Both micro signs (U+00B5 and U+03BC) become u, superscripts become digits, blanks and power signs go. */
function squeeze(text: string): string {
  return text
    .normalize('NFKC')
    .toLowerCase()
    .replaceAll('\u03bc', 'u')
    .replaceAll('\u2212', '-')
    .replace(/[\s_^*.\u00b7\u22c5]/g, '');
}

const bySpelling = new Map(units.flatMap((each) => each.spellings.map((spelling) => [spelling, each] as const)));

export function findUnit(text: string, quantity: Quantity): Unit | null {
  const found = bySpelling.get(squeeze(text));
  return found?.quantity === quantity ? found : null;
}

export const unitSymbols = (quantity: Quantity): string[] =>
  units.filter((each) => each.quantity === quantity).map((each) => each.symbol);

export const toSi = (value: number, from: Unit): number => (value * from.times) / from.over;
export const fromSi = (valueSi: number, to: Unit): number => (valueSi * to.over) / to.times;
