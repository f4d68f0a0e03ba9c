import { trimmed } from '@/src/ui/run-figures';

export type MaterialWindows = { name: string; unboundIntervalsUm: readonly (readonly [number, number | null])[] };

/** How much is written at a cutoff, and how many letters fit across the plot. */
export const labelStyles = {
  full: { lettersAcross: 110, hasName: true },
  short: { lettersAcross: 38, hasName: false },
} as const;
export type LabelStyle = keyof typeof labelStyles;

export type Cutoff = { radiusUm: number; label: string; material: number; level: number };

/** The finite ends of all windows, each with a height for its label at which it meets no other. */
export function cutoffsOf(
  materials: readonly MaterialWindows[],
  logRange: readonly [number, number],
  style: LabelStyle = 'full',
  levels = 5,
): Cutoff[] {
  const { lettersAcross, hasName } = labelStyles[style];
  const ends = materials.flatMap(({ name, unboundIntervalsUm }, material) =>
    [...new Set(unboundIntervalsUm.flat())]
      .filter((radiusUm): radiusUm is number => radiusUm !== null && radiusUm > 0)
      .map((radiusUm) => ({
        radiusUm,
        material,
        label: hasName ? `${shortName(name)} ${trimmed(radiusUm)}` : trimmed(radiusUm),
      })),
  );
  const visible = ends.filter(
    ({ radiusUm }) => Math.log10(radiusUm) >= logRange[0] && Math.log10(radiusUm) <= logRange[1],
  );
  return withLevels(
    visible.sort((a, b) => a.radiusUm - b.radiusUm),
    (logRange[1] - logRange[0]) / lettersAcross,
    levels,
  );
}

/** What stands in brackets tells materials apart in lists, not beside a line of their own dash and colour. */
const shortName = (name: string) => name.replace(/\s*\(.*\)$/, '');

/** Labels grow to the right from their line; `perLetter` is the width of a letter along the axis. */
function withLevels(ends: Omit<Cutoff, 'level'>[], perLetter: number, levels: number): Cutoff[] {
  const takenUntil = new Array<number>(levels).fill(-Infinity);
  return ends.map((end) => {
    const from = Math.log10(end.radiusUm);
    const free = takenUntil.findIndex((until) => until <= from);
    const level = free >= 0 ? free : takenUntil.indexOf(Math.min(...takenUntil));
    takenUntil[level] = from + end.label.length * perLetter;
    return { ...end, level };
  });
}
