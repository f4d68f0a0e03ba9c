import { add, divide, modulusOf, multiply, scale, squareRoot, subtract, type Complex } from './complex';

/** Relative permittivity of vacuum. */
export const VACUUM_EPS: Complex = [1, 0];

/** [n, k] -> eps = (n + ik)^2. Exact. */
export const indexToEps = ([n, k]: readonly [number, number]): [number, number] => [(n - k) * (n + k), 2 * n * k];

/** eps -> [n, k] with n, k >= 0. Range: Im eps >= 0 (passive, time factor exp(-i omega t)). Exact. */
export function epsToIndex(eps: Complex): [number, number] {
  const [n, k] = squareRoot(eps);
  return k < 0 ? [-n, -k] : [n, k];
}

/** Share of an added loss that tells the physical root from the other where both are lossless. */
const ADDED_LOSS = 1e-9;

function bruggemanRoots(epsA: Complex, epsB: Complex, fractionA: number): [Complex, Complex] {
  const b = add(scale(epsA, 3 * fractionA - 1), scale(epsB, 3 * (1 - fractionA) - 1));
  const product = multiply(epsA, epsB);
  const root = squareRoot(add(multiply(b, b), scale(product, 8)));
  const plus = scale(add(b, root), 0.25);
  const minus = scale(subtract(b, root), 0.25);
  // The smaller root by the product of both, -eps1 eps2/2: no cancellation.
  const isPlusLarger = modulusOf(plus) >= modulusOf(minus);
  const larger = isPlusLarger ? plus : minus;
  const smaller = divide(scale(product, -0.5), larger);
  return isPlusLarger ? [larger, smaller] : [smaller, larger];
}

/**
 * Effective permittivity [re, im] of two mixed phases, neither of which is the matrix (Bruggeman): the root with Im eps >= 0,
 * continuous in the fraction. Valid for inclusions much smaller than the wavelength; mixing rules differ among each other by 10
 * to 30 % in the result. Fractions of volume, 0 to 1. Source: Bruggeman (1935), Ann. Phys. 416, 636; Bohren & Huffman (1983), section 8.5.
 */
export function bruggemanTwo(epsA: Complex, epsB: Complex, fractionA: number): [number, number] {
  const [plus, minus] = bruggemanRoots(epsA, epsB, fractionA);
  const lossy = (eps: Complex): Complex => [eps[0], eps[1] + ADDED_LOSS * modulusOf(eps)];
  const [lossyPlus, lossyMinus] = bruggemanRoots(lossy(epsA), lossy(epsB), fractionA);
  const isPlus =
    Math.sign(lossyPlus[1]) === Math.sign(lossyMinus[1]) ? lossyPlus[0] >= lossyMinus[0] : lossyPlus[1] > 0;
  const passive = isPlus ? lossyPlus : lossyMinus;
  // Conjugate roots are equally large: which of them comes first says nothing, so the nearer one is taken.
  const isFirst = modulusOf(subtract(plus, passive)) <= modulusOf(subtract(minus, passive));
  const [re, im] = isFirst ? plus : minus;
  return [re, Math.max(0, im)];
}

/**
 * Effective permittivity [re, im] of inclusions in a matrix (Maxwell Garnett): eps_m (1 + 2 f K)/(1 - f K), K = (eps_i -
 * eps_m)/(eps_i + 2 eps_m). Inclusions small against the wavelength and well apart; `fractionInclusion` of volume, 0 to 1.
 * Source: Maxwell Garnett (1904), Phil. Trans. R. Soc. A 203, 385; Bohren & Huffman (1983), eq. 8.50.
 */
export function maxwellGarnett(epsMatrix: Complex, epsInclusion: Complex, fractionInclusion: number): [number, number] {
  const contrast = divide(subtract(epsInclusion, epsMatrix), add(epsInclusion, scale(epsMatrix, 2)));
  const numerator = add([1, 0], scale(contrast, 2 * fractionInclusion));
  const [re, im] = multiply(epsMatrix, divide(numerator, subtract([1, 0], scale(contrast, fractionInclusion))));
  return [re, Math.max(0, im)];
}

/** Index [n, k] of a solid with vacuum voids of this share of the volume; with Maxwell Garnett the solid is the matrix. */
export function porousIndex(
  solid: readonly [number, number],
  porosity: number,
  mixing: 'bruggeman' | 'maxwellGarnett',
): [number, number] {
  if (porosity === 0) return [solid[0], solid[1]];
  const eps = indexToEps(solid);
  return epsToIndex(
    mixing === 'maxwellGarnett' ? maxwellGarnett(eps, VACUUM_EPS, porosity) : bruggemanTwo(VACUUM_EPS, eps, porosity),
  );
}
