/** 97.5 % point of the standard normal distribution (NIST/SEMATECH e-Handbook, table 1.3.6.7.1, to 15 digits). */
const Z95 = 1.959_963_984_540_054;

/**
 * Wilson's 95 % interval of a share p seen in n independent trials: never leaves 0 to 1, usable for few trials. For weighted
 * rows n is the effective number (sum w)^2 / sum w^2 and the interval approximate. Without trials it is 0 to 1.
 * Source: Wilson (1927), J. Am. Stat. Assoc. 22, 209.
 */
export function wilsonInterval(share: number, trials: number): [number, number] {
  if (trials <= 0) return [0, 1];
  const z2 = Z95 * Z95;
  const centre = share + z2 / (2 * trials);
  const half = Z95 * Math.sqrt(Math.max(0, (share * (1 - share)) / trials + z2 / (4 * trials * trials)));
  const scale = 1 + z2 / trials;
  const low = share === 0 ? 0 : (centre - half) / scale;
  const high = share === 1 ? 1 : (centre + half) / scale;
  return [Math.max(0, low), Math.min(1, high)];
}

/** Number of equally weighted rows that would tell as much: (sum w)^2 / sum w^2 (Kish 1965). */
export function effectiveRows(sumOfWeights: number, sumOfSquares: number): number {
  return sumOfSquares > 0 ? sumOfWeights ** 2 / sumOfSquares : 0;
}
