import { gaussLegendre } from './gauss-legendre';

/** Ray-optics efficiencies of one refractive index, prepared for any optical depth. */
export interface RayOptics {
  /** Writes [qPr, qAbs] of a sphere of size parameter x, valid where x is large, into `out`. */
  at(out: Float64Array, x: number): void;
}

const ANGLES = 64;
const rule = gaussLegendre(ANGLES);

/**
 * Limit of Mie's efficiencies for x -> infinity, with any absorption along the chords: incidence t, refraction r,
 * Fresnel reflectance R of the complex index, chord depth tau (4 x k cos r for weak absorption);
 * Q_pr = Int 2 sin t cos t {1 - Re[R e^{i(pi-2t)} + (1-R)^2 e^{-tau} e^{2i(t-r)} / (1 - R e^{-tau} e^{i(pi-2r)})]} dt,
 * per polarisation, averaged. Equals Ashkin's (1992, Biophys. J. 61, 569) sphere for k = 0.
 * Quadrature error of Q_pr below 1e-6 for n >= 1 and below 1e-3 for n < 1 with k near 0 (kink at the critical angle).
 */
export function rayOptics(n: number, k: number): RayOptics {
  const weight = new Float64Array(2 * ANGLES);
  const reflectance = new Float64Array(2 * ANGLES);
  const reflectedCosine = new Float64Array(2 * ANGLES);
  const exitCosine = new Float64Array(2 * ANGLES);
  const exitSine = new Float64Array(2 * ANGLES);
  const bounceCosine = new Float64Array(2 * ANGLES);
  const bounceSine = new Float64Array(2 * ANGLES);
  const depthPerX = new Float64Array(2 * ANGLES);
  rule.nodes.forEach((node, angle) => {
    // sin t = 1 - v^2: the integrand turns steeply towards grazing incidence, where this crowds the nodes.
    const v = 0.5 * (node + 1);
    const sine = 1 - v * v;
    const incidence = Math.asin(sine);
    const measure = 2 * sine * 2 * v * 0.5 * rule.weights[angle];
    const inside = normalWaveNumber(sine, n, k);
    const refraction = Math.atan2(sine, inside.re);
    const depth = 4 * inside.im * Math.cos(refraction) ** 2;
    fresnelReflectance(Math.cos(incidence), n, k, inside).forEach((value, polarisation) => {
      const row = 2 * angle + polarisation;
      weight[row] = 0.5 * measure;
      reflectance[row] = value;
      reflectedCosine[row] = -Math.cos(2 * incidence);
      exitCosine[row] = Math.cos(2 * (incidence - refraction));
      exitSine[row] = Math.sin(2 * (incidence - refraction));
      bounceCosine[row] = -Math.cos(2 * refraction);
      bounceSine[row] = Math.sin(2 * refraction);
      depthPerX[row] = depth;
    });
  });
  return {
    at(out, x) {
      let pressure = 0;
      let absorption = 0;
      for (let row = 0; row < weight.length; row++) {
        const r = reflectance[row];
        const through = Math.exp(-x * depthPerX[row]);
        const echo = r * through;
        if (echo >= 1) {
          // Total reflection by a body that absorbs nothing: no light enters.
          pressure += weight[row] * (1 - reflectedCosine[row]);
          continue;
        }
        const dr = 1 - echo * bounceCosine[row];
        const di = -echo * bounceSine[row];
        const transmitted =
          ((1 - r) * (1 - r) * through * (exitCosine[row] * dr + exitSine[row] * di)) / (dr * dr + di * di);
        pressure += weight[row] * (1 - r * reflectedCosine[row] - transmitted);
        absorption += (weight[row] * (1 - r) * (1 - through)) / (1 - echo);
      }
      out[0] = pressure;
      out[1] = absorption;
    },
  };
}

interface Complex {
  re: number;
  im: number;
}

/**
 * Component of the refracted wave vector along the surface normal, in units of the vacuum's. It gives the true angle of
 * refraction tan r = sin t / re of an absorbing body (Born & Wolf, section 14.2), also where n < 1.
 */
function normalWaveNumber(sine: number, n: number, k: number): Complex {
  const square = n * n - k * k - sine * sine;
  const modulus = Math.hypot(square, 2 * n * k);
  // The smaller part follows from the product re im = n k: a difference would lose a tiny k.
  if (square >= 0) {
    const re = Math.sqrt(0.5 * (modulus + square));
    return { re, im: (n * k) / re };
  }
  const im = Math.sqrt(0.5 * (modulus - square));
  return { re: (n * k) / im, im };
}

/** Reflectance of a plane surface for light polarised across and in the plane of incidence (Fresnel, complex index). */
function fresnelReflectance(cosine: number, n: number, k: number, inside: Complex): [number, number] {
  const across = ratio2(cosine - inside.re, -inside.im, cosine + inside.re, inside.im);
  const epsR = (n * n - k * k) * cosine;
  const epsI = 2 * n * k * cosine;
  return [across, ratio2(epsR - inside.re, epsI - inside.im, epsR + inside.re, epsI + inside.im)];
}

function ratio2(ar: number, ai: number, br: number, bi: number): number {
  return (ar * ar + ai * ai) / (br * br + bi * bi);
}
