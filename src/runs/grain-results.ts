/** Result columns in the order in which they are stored and hashed; NaN where a quantity does not exist. */
export const resultNames = [
  'qpr',
  'beta',
  'pUnbound',
  'prTimeYr',
  'collisionTimeYr',
  'semiMajorAxisAu',
  'eccentricity',
  'vInfKmS',
  'temperatureK',
  'lorentzRatio',
] as const;
export type ResultName = (typeof resultNames)[number];

export type GrainResults = Record<ResultName, Float64Array> & {
  length: number;
  isUnbound: Uint8Array;
  regime: Uint8Array;
};

export function emptyResults(length: number): GrainResults {
  const columns = Object.fromEntries(resultNames.map((name) => [name, new Float64Array(length).fill(NaN)])) as Record<
    ResultName,
    Float64Array
  >;
  return { length, ...columns, isUnbound: new Uint8Array(length), regime: new Uint8Array(length) };
}

/** Row after row, so that the digest does not depend on how the rows were cut into chunks. */
export function resultBytes(results: GrainResults): Uint8Array {
  const perRow = resultNames.length + 2;
  const view = new DataView(new ArrayBuffer(8 * perRow * results.length));
  for (let row = 0; row < results.length; row += 1) {
    let at = 8 * perRow * row;
    for (const name of resultNames) {
      const value = results[name][row];
      view.setFloat64(at, Number.isNaN(value) ? NaN : value, true);
      at += 8;
    }
    view.setFloat64(at, results.isUnbound[row], true);
    view.setFloat64(at + 8, results.regime[row], true);
  }
  return new Uint8Array(view.buffer);
}
