import { describe, expect, test } from 'vitest';
import { collectedGrainsCsv } from '@/fixtures/collected-grains';
import { collisionalPopulationCsv } from '@/fixtures/collisional-population';
import { fixtureBytes, readBytes } from './reading';

const textOf = (name: string) => new TextDecoder().decode(fixtureBytes(name));

describe('the demo catalogues', () => {
  test('are what their generators make, to the byte', () => {
    expect(textOf('collected-grains.csv')).toBe(collectedGrainsCsv());
    expect(textOf('collisional-population.csv')).toBe(collisionalPopulationCsv());
  });

  test('say on their first line that they are invented', () => {
    for (const name of ['collected-grains.csv', 'collisional-population.csv'])
      expect(textOf(name)).toMatch(/^# Invented/);
  });

  test('the collected grains are read without a reject or a warning, with errors and four materials', async () => {
    const read = await readBytes(fixtureBytes('collected-grains.csv'));
    expect(read).toMatchObject({ accepted: 400, rejected: 0, blank: 1, warnings: [] });
    expect(new Set(read.grains.map(({ material }) => material))).toEqual(
      new Set(['astrosil', 'carbon_be', 'troilite', 'organics']),
    );
    expect(
      read.grains.every(({ radiusSigmaM, densitySigmaKgM3 }) => radiusSigmaM !== null && densitySigmaKgM3 !== null),
    ).toBe(true);
    expect(read.grains.every(({ radiusM }) => radiusM >= 0.025e-6 && radiusM <= 15e-6)).toBe(true);
  });

  test('the population follows number ~ radius^-3.5 (Dohnanyi 1969) between any two radii', async () => {
    const read = await readBytes(fixtureBytes('collisional-population.csv'));
    expect(read).toMatchObject({ accepted: 20_000, rejected: 0, warnings: [] });
    const above = (radiusM: number) =>
      read.grains.reduce((sum, grain) => sum + (grain.radiusM > radiusM ? grain.count : 0), 0);
    const expected = (radiusUm: number) => radiusUm ** -2.5 - 200 ** -2.5;
    let worst = 0;
    for (const radiusUm of [0.05, 0.5, 5, 50]) {
      const measured = above(radiusUm * 1e-6) / above(0.02e-6);
      worst = Math.max(worst, Math.abs(measured / (expected(radiusUm) / expected(0.02)) - 1));
    }
    console.log(`number above a radius against the power law: worst relative error ${worst}`);
    // One step holds ln(1e4) / 20000 * 2.5 = 1.15e-3 of what lies above it, and the cut may fall anywhere in a step.
    expect(worst).toBeLessThan(2.4e-3);
  });
});
