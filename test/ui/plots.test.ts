import { describe, expect, it } from 'vitest';
import { plotCsv } from '@/src/ui/plots/plot-table';
import { betaRange } from '@/src/ui/plots/draw-beta-curve';
import { binsOf, sizeDistributionTable } from '@/src/ui/plots/draw-size-distribution';
import { cutoffsOf } from '@/src/ui/plots/unbound-window';
import { axisRange, logTicks } from '@/src/ui/plots/radius-ticks';
import { parseRadiusRange, rangeAround, writeRadiusRange } from '@/src/ui/plots/radius-range';

describe('the CSV of a plot', () => {
  it('has units in the header, full precision and CRLF (RFC 4180)', () => {
    const csv = plotCsv({
      columns: [{ title: 'radius', unit: 'µm' }, { title: 'beta' }],
      rows: [[0.1234567890123, null]],
    });
    expect(csv).toBe('radius (µm),beta\r\n0.1234567890123,\r\n');
  });
  it('quotes text and disarms formulas, but leaves negative numbers alone', () => {
    const csv = plotCsv({ columns: [{ title: 'a' }], rows: [['=1+1'], ['say "x", y'], [-1.5]] });
    expect(csv).toBe(`a\r\n'=1+1\r\n"say ""x"", y"\r\n-1.5\r\n`);
  });
});

describe('the ticks of a radius axis', () => {
  it('are decades over a wide range', () => {
    expect(logTicks([-2, 2]).labels).toEqual(['0.01', '0.1', '1', '10', '100']);
  });
  it('are 1-2-5 over two decades', () => {
    expect(logTicks([-1, 1]).labels).toEqual(['0.1', '0.2', '0.5', '1', '2', '5', '10']);
  });
  it('never leave a narrow range without a label', () => {
    for (let from = -3; from < 3; from += 0.037) expect(logTicks([from, from + 0.12]).labels.length).toBeGreaterThan(1);
  });
});

describe('the radius range in the address', () => {
  it('survives a round trip', () => {
    expect(parseRadiusRange(writeRadiusRange([0.05, 30]))).toEqual([0.05, 30]);
  });
  it('is ignored when it is empty, reversed or beyond the curve', () => {
    for (const text of ['', 'x..y', '3..1', '1..1', '0..1', '1..1e9']) expect(parseRadiusRange(text)).toBeNull();
  });
  it('shows every given radius', () => {
    const [low, high] = rangeAround([0.3, 20, 0, Infinity]);
    expect(low).toBeLessThan(0.3);
    expect(high).toBeGreaterThan(20);
  });
});

describe('the labels of the cutoffs', () => {
  const materials = [
    { name: 'A', unboundIntervalsUm: [[0.1, 0.5]] as [number, number][] },
    { name: 'B', unboundIntervalsUm: [[0, 0.51]] as [number, number][] },
    { name: 'C', unboundIntervalsUm: [] },
    { name: 'D', unboundIntervalsUm: [[0.2, null]] as [number, null][] },
  ];
  it('stand at finite ends only, in order of radius', () => {
    expect(cutoffsOf(materials, [-2, 2]).map(({ label }) => label)).toEqual([
      'A 0.100',
      'D 0.200',
      'A 0.500',
      'B 0.510',
    ]);
  });
  it('avoid each other when they are close', () => {
    const [, , a, b] = cutoffsOf(materials, [-2, 2]);
    expect(a.level).not.toBe(b.level);
  });
  it('are left out where the plot does not reach', () => {
    expect(cutoffsOf(materials, [-0.5, 0]).map(({ label }) => label)).toEqual(['A 0.500', 'B 0.510']);
  });
});

describe('the size distribution', () => {
  it('shows shares of the whole, and keeps the absolute weights in its table', () => {
    const histogram = { by: 'number' as const, unit: 'grains', edgesUm: [0.1, 1, 10], unbound: [3, 0], bound: [0, 1] };
    expect(binsOf(histogram).map(({ unbound, bound }) => [unbound, bound])).toEqual([
      [0.75, 0],
      [0, 0.25],
    ]);
    expect(sizeDistributionTable(histogram).rows).toEqual([
      [0.1, 1, 75, 0, 3, 0],
      [1, 10, 0, 25, 0, 1],
    ]);
  });
});

describe('the beta axis', () => {
  it('shows the critical value even when no curve reaches it', () => {
    const curve = { name: 'x', radiiUm: [1, 2], qpr: [1, 1], beta: [0.01, 0.02], unboundIntervalsUm: [] };
    const [low, high] = betaRange([curve], 0.5, [1, 2]);
    expect(10 ** low).toBeLessThan(0.01);
    expect(10 ** high).toBeGreaterThan(0.5);
  });
});

describe('a zoom with the pointer', () => {
  it('is read as a range, anything else is not', () => {
    expect(axisRange({ 'xaxis.range[0]': -1, 'xaxis.range[1]': 1 })).toEqual([-1, 1]);
    expect(axisRange({ autosize: true })).toBeNull();
    expect(axisRange(null)).toBeNull();
  });
});
