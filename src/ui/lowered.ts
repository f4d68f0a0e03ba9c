export type TextPart = { text: string; isLowered: boolean };

/** One letter, an underscore and a word is a quantity with an index: Q_pr, β_c. Names such as carbon_be are not. */
const index = /(?<=(?<![\p{L}\d])\p{L})_(\p{L}+)/u;

/** Counts behind an element or a group: the 2 and the 4 of Mg2SiO4. */
const atomCount = /(?<=[A-Za-z)])(\d+(?:\.\d+)?)/;

export const indexedParts = (text: string): TextPart[] => parts(text, index);
export const formulaParts = (formula: string): TextPart[] => parts(formula, atomCount);

/** Splitting by a pattern with one group leaves what the group held at every second place. */
function parts(text: string, lowered: RegExp): TextPart[] {
  return text
    .split(lowered)
    .map((part, place) => ({ text: part, isLowered: place % 2 === 1 }))
    .filter((part) => part.text !== '');
}
