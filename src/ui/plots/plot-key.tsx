import { materialDashes, nthOf, type PlotPalette } from './plot-palette';

export type KeyEntry = { label: string; sample: { line: number } | { bar: 'unbound' | 'bound' } };

/** The key of a plot, outside of it, where it can wrap without taking room from the drawing. */
export function PlotKey({ entries, palette }: { entries: readonly KeyEntry[]; palette: PlotPalette | null }) {
  return (
    <ul className="flex min-h-6 flex-wrap gap-x-5 gap-y-1 text-sm">
      {entries.map(({ label, sample }) => (
        <li key={label} className="flex items-center gap-2">
          {palette &&
            ('line' in sample ? (
              <LineSample index={sample.line} palette={palette} />
            ) : (
              <BarSample fate={sample.bar} palette={palette} />
            ))}
          {label}
        </li>
      ))}
    </ul>
  );
}

const strokeDashes: Record<(typeof materialDashes)[number], string | undefined> = {
  solid: undefined,
  dash: '7 5',
  dot: '2 3',
  dashdot: '7 3 2 3',
  longdash: '11 5',
  longdashdot: '11 3 2 3',
};

function LineSample({ index, palette }: { index: number; palette: PlotPalette }) {
  return (
    <svg width="34" height="8" aria-hidden="true" className="shrink-0">
      <line
        x1="0"
        x2="34"
        y1="4"
        y2="4"
        strokeWidth="2.5"
        stroke={nthOf(palette.materials, index)}
        strokeDasharray={strokeDashes[nthOf(materialDashes, index)]}
      />
    </svg>
  );
}

function BarSample({ fate, palette }: { fate: 'unbound' | 'bound'; palette: PlotPalette }) {
  return (
    <svg width="16" height="16" aria-hidden="true" className="shrink-0">
      <rect width="16" height="16" fill={palette[fate]} />
      {fate === 'unbound' && <path d="M0 8 8 0M0 16 16 0M8 16 16 8" stroke={palette.paper} strokeWidth="1.75" />}
    </svg>
  );
}
