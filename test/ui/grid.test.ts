import { describe, expect, it } from 'vitest';
import { cellText } from '@/src/ui/grid/cell-text';
import { rangeProblem } from '@/src/ui/grid/filter-problem';
import { gridRequest } from '@/src/ui/grid/grid-request';
import { countWords } from '@/src/ui/grid/row-source';

describe('asking for rows', () => {
  it('sends sort, filters that say something, and the block', () => {
    const path = gridRequest(
      '/api/v1/runs/1/grains',
      { fate: 'unbound', label: ' ', betaMin: ' 0.5 ' },
      { field: 'beta', order: 'desc' },
      200,
    );
    expect(path).toBe('/api/v1/runs/1/grains?sort=beta&order=desc&fate=unbound&betaMin=0.5&limit=100&offset=200');
  });
  it('asks for the first block without an offset', () => {
    expect(gridRequest('/x', {}, null, 0)).toBe('/x?limit=100');
  });
});

describe('what a cell says', () => {
  const number = { field: 'v', header: 'v', kind: 'number' } as const;
  it('has four figures', () => {
    expect(cellText(number, 0.123456)).toBe('0.1235');
    expect(cellText(number, 1234567)).toBe('1.235 × 10⁶');
    expect(cellText(number, 0.000012346)).toBe('1.235 × 10⁻⁵');
    expect(cellText(number, 0)).toBe('0');
  });
  it('shows a dash for what does not exist', () => {
    expect(cellText(number, null)).toBe('—');
    expect(cellText({ field: 'l', header: 'l', kind: 'text' }, null)).toBe('—');
  });
  it('shows whole counts in full and choices in words', () => {
    expect(cellText({ field: 'n', header: 'n', kind: 'count' }, 1234567)).toBe('1234567');
    expect(cellText({ field: 'f', header: 'f', kind: 'choice', words: { u: 'unbound' } }, 'u')).toBe('unbound');
  });
});

describe('limits of a filter', () => {
  it('may be empty or numbers in order', () => {
    expect(rangeProblem('', '')).toBeNull();
    expect(rangeProblem('1e-3', '2')).toBeNull();
  });
  it('are refused when reversed or not numbers', () => {
    expect(rangeProblem('2', '1')).toContain('above');
    expect(rangeProblem('0,5', '')).toContain('numbers');
  });
});

describe('the row count', () => {
  it('says whether a filter is on', () => {
    expect(countWords(20000, false)).toBe('20,000 rows.');
    expect(countWords(1, true)).toBe('1 row with this filter.');
  });
});
