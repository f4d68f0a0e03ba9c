import { describe, expect, it } from 'vitest';
import { formulaParts, indexedParts, type TextPart } from '@/src/ui/lowered';

const marked = (parts: TextPart[]) => parts.map(({ text, isLowered }) => (isLowered ? `[${text}]` : text)).join('');

describe('indices in sentences', () => {
  it.each([
    ['The geometric answer (Q_pr = 1)', 'The geometric answer (Q[pr] = 1)'],
    ['leaves when β ≥ β_c; equality counts', 'leaves when β ≥ β[c]; equality counts'],
    ['(1 − β_p)(1 − r/2a)', '(1 − β[p])(1 − r/2a)'],
    ['the slug carbon_be stays', 'the slug carbon_be stays'],
    ['no index here', 'no index here'],
    ['', ''],
  ])('%s', (text, expected) => expect(marked(indexedParts(text))).toBe(expected));
});

describe('chemical formulas', () => {
  it.each([
    ['Mg2SiO4', 'Mg[2]SiO[4]'],
    ['Mg0.5Fe0.5SiO3', 'Mg[0.5]Fe[0.5]SiO[3]'],
    ['(Mg,Fe)2SiO4', '(Mg,Fe)[2]SiO[4]'],
    ['MgFeSiO4-like (synthetic)', 'MgFeSiO[4]-like (synthetic)'],
    ['C:H', 'C:H'],
  ])('%s', (formula, expected) => expect(marked(formulaParts(formula))).toBe(expected));
});
