/** Median seconds of `rounds` runs of each of two works, alternating, so that a noisy machine disturbs both alike. */
export function alternating(
  work: () => void,
  floor: () => void,
  rounds = 7,
): { seconds: number; floorSeconds: number; ratio: number } {
  const pairs = Array.from({ length: rounds }, () => [secondsOf(work), secondsOf(floor)] as const);
  return {
    seconds: median(pairs.map(([one]) => one)),
    floorSeconds: median(pairs.map(([, other]) => other)),
    ratio: median(pairs.map(([one, other]) => one / other)),
  };
}

function secondsOf(work: () => void): number {
  const start = performance.now();
  work();
  return (performance.now() - start) / 1000;
}

export function median(values: number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)];
}

export const shortText = (value: number): string =>
  value >= 1000 ? Math.round(value).toLocaleString('en-US') : value.toPrecision(3);
