import { describe, expect, it } from 'vitest';
import type { MaterialSummary, RunSummary } from '@/entities/run-summary';
import * as words from '@/src/ui/run-answer';

/** Units do not break away from their numbers on screen; here that would only make the expected text hard to read. */
const breakable = (text: string) => text.replaceAll('\u00a0', ' ');
const intervalsInWords = (...given: Parameters<typeof words.intervalsInWords>) =>
  breakable(words.intervalsInWords(...given));
const materialSentence = (...given: Parameters<typeof words.materialSentence>) =>
  breakable(words.materialSentence(...given));
const runAnswer = (...given: Parameters<typeof words.runAnswer>): words.RunAnswer =>
  JSON.parse(breakable(JSON.stringify(words.runAnswer(...given))));

const carbon: MaterialSummary = {
  material: 'carbon_be',
  name: 'Amorphous carbon',
  grains: 60,
  meanDensityGCm3: 1.8,
  betaMax: 3.4,
  radiusAtBetaMaxUm: 0.11,
  unboundIntervalsUm: [[0, 1.2134]],
  geometricBlowoutRadiusUm: 0.638,
  curveKey: 'k',
  relativeErrorBound: 1e-4,
  shareOutsideValidRange: 0.001,
  unboundNumberShare: 0.7,
};

const summary: RunSummary = {
  grains: 100,
  counted: 100,
  betaCritical: 0.5,
  unbound: {
    rows: 61,
    number: 61,
    numberShare: 0.613,
    areaShare: 0.12,
    massShare: 0.004,
    expectedNumberShare: 0.613,
    interval95: [0.581, 0.642],
    repelled: 0,
  },
  geometric: { numberShare: 0.5, areaShare: 0.1, massShare: 0 },
  perMaterial: [carbon],
  warnings: [],
};

const spoken = (changed: Partial<RunSummary['unbound']>) =>
  runAnswer({ ...summary, unbound: { ...summary.unbound, ...changed } }, 'the Sun')
    .headline.map((part) => (typeof part === 'string' ? part : part.figure))
    .join('');

describe('the headline', () => {
  it('says the three shares and the interval', () => {
    expect(spoken({})).toBe(
      'Starlight of the Sun unbinds 61.3 % of the grains (95 % interval 58.1–64.2 %), 12.0 % of their cross-section and 0.400 % of their mass.',
    );
  });
  it('says none when no grain is unbound', () => {
    expect(spoken({ rows: 0, number: 0, numberShare: 0, areaShare: 0, massShare: 0, interval95: [0, 0.037] })).toBe(
      'Starlight of the Sun unbinds none of the grains (95 % interval 0.0–3.7 %).',
    );
  });
  it('never rounds nearly all to all', () => {
    expect(spoken({ numberShare: 0.99996 })).toContain('more than 99.9 % of the grains');
    expect(spoken({ massShare: 1e-9 })).toContain('less than 0.001 % of their mass');
  });
});

describe('the sentence of a material', () => {
  it('is "never" with the peak when there is no unbound radius', () => {
    const ice = { name: 'Water ice', unboundIntervalsUm: [], betaMax: 0.4312, radiusAtBetaMaxUm: 0.2101 };
    expect(materialSentence(ice)).toBe('Water ice: never; beta peaks at 0.431 at 0.210 µm.');
  });
  it('is "below" when the interval reaches down to the smallest radius', () => {
    expect(materialSentence(carbon)).toBe('Amorphous carbon below 1.21 µm.');
  });
  it('is "between" for a window with two ends', () => {
    const silicate = {
      ...carbon,
      name: 'Astronomical silicate',
      unboundIntervalsUm: [[0.056, 0.62]] as [number, number][],
    };
    expect(materialSentence(silicate)).toBe('Astronomical silicate between 0.0560 and 0.620 µm.');
  });
  it('lists several windows', () => {
    expect(
      intervalsInWords([
        [0, 0.01],
        [0.1, 0.2],
        [0.3, 0.4],
      ]),
    ).toBe('below 0.0100 µm, between 0.100 and 0.200 µm and between 0.300 and 0.400 µm');
  });
  it('tells open ends and touching points apart', () => {
    expect(intervalsInWords([[2, null]])).toBe('above 2.00 µm');
    expect(intervalsInWords([[0, null]])).toBe('at every radius');
    expect(intervalsInWords([[0.3, 0.3]])).toBe('at 0.300 µm only');
  });
});

describe('around the answer', () => {
  it('gives the geometric comparison for the population and for each material', () => {
    const answer = runAnswer(summary, 'the Sun');
    expect(answer.comparison).toContain('50.0 % by number, 10.0 % by cross-section and none by mass');
    expect(answer.materials[0].geometric).toBe('With Q_pr = 1: below 0.638 µm.');
  });
  it('says that the radii hold for the mean density', () => {
    expect(runAnswer(summary, 'the Sun').notes[1]).toContain(
      'mean density of each material (Amorphous carbon 1.80 g/cm³)',
    );
  });
  it('mentions the expected share only when the errors move it', () => {
    const moved = { ...summary, unbound: { ...summary.unbound, expectedNumberShare: 0.59 } };
    expect(runAnswer(moved, 'the Sun').notes.join(' ')).toContain('expected share by number is 59.0 %');
    expect(runAnswer(summary, 'the Sun').notes.join(' ')).not.toContain('expected share');
  });
  it('counts the repelled grains when there are any', () => {
    const one = { ...summary, unbound: { ...summary.unbound, repelled: 1 } };
    expect(runAnswer(one, 'the Sun').notes.join(' ')).toContain('1 grain with beta');
  });
});
