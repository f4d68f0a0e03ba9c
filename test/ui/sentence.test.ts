import { describe, expect, it } from 'vitest';
import { sentence, withMicroSign } from '@/src/ui/sentence';

describe('remarks from data files as sentences', () => {
  it('begin with a capital and end with one full stop', () => {
    expect(sentence('spheres, not flakes; no oxide skin')).toBe('Spheres, not flakes; no oxide skin.');
    expect(sentence('Older sets give 3700 K.')).toBe('Older sets give 3700 K.');
  });

  it('write micrometres with the micro sign, and leave other words alone', () => {
    expect(sentence('data start at 0.114 um')).toBe('Data start at 0.114 µm.');
    expect(withMicroSign('n, 0.21-5 um')).toBe('n, 0.21-5 µm');
    expect(withMicroSign('a sum of 3 umbrellas')).toBe('a sum of 3 umbrellas');
  });

  it('say nothing where there is nothing to say', () => expect(sentence('  ')).toBe(''));
});
