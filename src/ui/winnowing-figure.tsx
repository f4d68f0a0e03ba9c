type Point = readonly [x: number, y: number];
type Stream = { path: readonly [Point, Point, Point, Point]; at: readonly number[] };

const heavy = [
  [60, 268, 9],
  [104, 262, 6],
  [148, 258, 12],
  [205, 246, 7],
  [252, 240, 10],
  [300, 226, 5],
  [342, 222, 8],
] as const;

/** The paths of what drifts off, and how far along them its grains are. */
const streams: readonly Stream[] = [
  {
    path: [
      [52, 238],
      [130, 214],
      [236, 150],
      [372, 14],
    ],
    at: [0.12, 0.36, 0.6, 0.82, 0.97],
  },
  {
    path: [
      [92, 230],
      [190, 200],
      [292, 140],
      [392, 62],
    ],
    at: [0.1, 0.3, 0.52, 0.74, 0.93],
  },
  {
    path: [
      [150, 218],
      [236, 192],
      [322, 150],
      [396, 112],
    ],
    at: [0.16, 0.42, 0.68, 0.9],
  },
];

const largestRadius = 5;

/** The product in one picture: the heavy grains stay below the line, the light ones drift off, the lightest farthest. */
export function WinnowingFigure() {
  return (
    <svg
      viewBox="0 0 400 290"
      className="w-full"
      role="img"
      aria-label="Grains on a sloping line: large ones rest below it, small ones drift away above it"
    >
      <path d="M10 252 L392 176" className="stroke-ink" strokeWidth="1.5" fill="none" />
      <g className="fill-ink">
        {heavy.map(([x, y, r]) => (
          <circle key={x} cx={x} cy={y} r={r} />
        ))}
      </g>
      {streams.map(({ path, at }) => (
        <g key={path[0][0]}>
          <path d={curve(path)} className="stroke-straw" strokeWidth="0.9" fill="none" />
          {at.map((share) => {
            const [x, y] = pointAt(path, share);
            return (
              <circle key={share} cx={x} cy={y} r={rounded(largestRadius * (1 - 0.8 * share))} className="fill-chaff" />
            );
          })}
        </g>
      ))}
    </svg>
  );
}

const curve = ([from, ...through]: Stream['path']) => `M${from.join(' ')} C${through.flat().join(' ')}`;

/** Bernstein form of a cubic curve. */
function pointAt([a, b, c, d]: Stream['path'], share: number): Point {
  const rest = 1 - share;
  const along = (axis: 0 | 1) =>
    rest ** 3 * a[axis] + 3 * rest ** 2 * share * b[axis] + 3 * rest * share ** 2 * c[axis] + share ** 3 * d[axis];
  return [rounded(along(0)), rounded(along(1))];
}

const rounded = (value: number) => Math.round(value * 10) / 10;
