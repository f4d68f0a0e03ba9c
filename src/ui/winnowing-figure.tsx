const heavy = [
  [60, 268, 9],
  [104, 262, 6],
  [148, 258, 12],
  [205, 246, 7],
  [252, 240, 10],
  [300, 226, 5],
  [342, 222, 8],
] as const;
const light = [
  [88, 206, 4.2],
  [132, 182, 3.6],
  [176, 166, 3.8],
  [214, 132, 3],
  [258, 116, 2.6],
  [296, 84, 2.2],
  [334, 62, 1.8],
  [362, 34, 1.3],
  [236, 178, 3.2],
  [318, 130, 2.3],
  [372, 84, 1.5],
] as const;

/** The product in one picture: the heavy grains stay below the line, the light ones drift off. */
export function WinnowingFigure() {
  return (
    <svg
      viewBox="0 0 400 300"
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
      <g className="fill-chaff">
        {light.map(([x, y, r]) => (
          <circle key={`${x}-${y}`} cx={x} cy={y} r={r} />
        ))}
      </g>
      <g className="stroke-straw" strokeWidth="0.8" fill="none" opacity="0.9">
        <path d="M60 226 C150 200 260 150 388 20" />
        <path d="M100 216 C200 180 300 130 394 60" />
        <path d="M150 206 C240 176 320 140 396 100" />
      </g>
    </svg>
  );
}
