import type { NarrowFeature } from './narrow-features';
import { COARSEST_INTERVALS, type SpectralGrid } from './spectral-grid';

const EVEN_SHARE = 0.4;
const SHARE_PER_FEATURE = 0.05;
const LARGEST_FEATURE_SHARE = 0.25;
const FEATURE_MARGIN = 2;
const FEATURE_BREAKS = 64;

/**
 * Nodes and weights of a tabulated flux F_lambda, linear between its rows. Each weight is the exact integral of the flux
 * times the node's hat function, so narrow lines and steps keep their energy on every level; the mean of a smooth Q
 * then converges with the square of the node spacing. Nodes are spaced partly evenly in ln lambda, partly by energy.
 */
export function tableGrid(
  table: { wavelengthUm: number[]; flux: number[] },
  levels: number,
  features: NarrowFeature[],
): SpectralGrid {
  const intervals = COARSEST_INTERVALS << (levels - 1);
  const nodesUm = placeNodes(table.wavelengthUm, table.flux, features, intervals);
  const finest = hatIntegrals(nodesUm, table.wavelengthUm, table.flux);
  const weights: Float64Array[] = [finest];
  for (let level = levels - 1; level > 0; level--) {
    weights.unshift(coarsen(weights[0], nodesUm, 1 << (levels - 1 - level)));
  }
  for (const level of weights) normalise(level);
  return { wavelengthM: nodesUm.map((wavelengthUm) => wavelengthUm * 1e-6), weights };
}

function placeNodes(rowsUm: number[], flux: number[], features: NarrowFeature[], intervals: number): Float64Array {
  const last = rowsUm.length - 1;
  const energyBelow = new Float64Array(last + 1);
  for (let row = 1; row <= last; row++) {
    energyBelow[row] = energyBelow[row - 1] + 0.5 * (flux[row] + flux[row - 1]) * (rowsUm[row] - rowsUm[row - 1]);
  }
  const inside = features.filter(
    ({ wavelengthM }) => wavelengthM * 1e6 > rowsUm[0] && wavelengthM * 1e6 < rowsUm[last],
  );
  const featureShare = Math.min(LARGEST_FEATURE_SHARE, SHARE_PER_FEATURE * inside.length);
  const breaksUm = [...rowsUm, ...inside.flatMap((feature) => breaksAround(feature))]
    .filter((wavelengthUm) => wavelengthUm >= rowsUm[0] && wavelengthUm <= rowsUm[last])
    .sort((a, b) => a - b);
  const span = Math.log(rowsUm[last] / rowsUm[0]);
  let row = 1;
  const share = breaksUm.map((wavelengthUm) => {
    while (row < last && rowsUm[row] < wavelengthUm) row++;
    const part = (wavelengthUm - rowsUm[row - 1]) / (rowsUm[row] - rowsUm[row - 1]);
    const energy = energyBelow[row - 1] + part * (energyBelow[row] - energyBelow[row - 1]);
    const smooth =
      (EVEN_SHARE * Math.log(wavelengthUm / rowsUm[0])) / span + ((1 - EVEN_SHARE) * energy) / energyBelow[last];
    const crowded = inside.reduce((sum, feature) => sum + cauchy(wavelengthUm, feature) / inside.length, 0);
    return (1 - featureShare) * smooth + featureShare * crowded;
  });
  return invert(breaksUm, share, intervals);
}

/** Nodes at equal steps of the piecewise linear share, ends included. */
function invert(breaksUm: number[], share: number[], intervals: number): Float64Array {
  const last = breaksUm.length - 1;
  const nodes = new Float64Array(intervals + 1);
  let cell = 1;
  for (let index = 1; index < intervals; index++) {
    const target = share[0] + ((share[last] - share[0]) * index) / intervals;
    while (cell < last && share[cell] < target) cell++;
    const part = (target - share[cell - 1]) / (share[cell] - share[cell - 1]);
    nodes[index] = breaksUm[cell - 1] * (breaksUm[cell] / breaksUm[cell - 1]) ** part;
  }
  nodes[0] = breaksUm[0];
  nodes[intervals] = breaksUm[last];
  return nodes;
}

function cauchy(wavelengthUm: number, { wavelengthM, relativeWidth }: NarrowFeature): number {
  return 0.5 + Math.atan(Math.log(wavelengthUm / (wavelengthM * 1e6)) / (FEATURE_MARGIN * relativeWidth)) / Math.PI;
}

/** Wavelengths (um) at equal steps of the feature's own crowd. */
function breaksAround({ wavelengthM, relativeWidth }: NarrowFeature): number[] {
  return Array.from({ length: FEATURE_BREAKS }, (_, index) => {
    const angle = Math.PI * ((index + 0.5) / FEATURE_BREAKS - 0.5);
    return wavelengthM * 1e6 * Math.exp(FEATURE_MARGIN * relativeWidth * Math.tan(angle));
  });
}

/** Integral of flux times hat over the union of both grids; both factors are linear there, so Simpson's rule is exact. */
function hatIntegrals(nodes: Float64Array, wavelengthUm: number[], flux: number[]): Float64Array {
  const weights = new Float64Array(nodes.length);
  let row = 1;
  for (let cell = 1; cell < nodes.length; cell++) {
    const left = nodes[cell - 1];
    const width = nodes[cell] - left;
    let from = left;
    while (from < nodes[cell]) {
      while (row < wavelengthUm.length - 1 && wavelengthUm[row] <= from) row++;
      const to = row < wavelengthUm.length - 1 ? Math.min(nodes[cell], wavelengthUm[row]) : nodes[cell];
      const slope = (flux[row] - flux[row - 1]) / (wavelengthUm[row] - wavelengthUm[row - 1]);
      const fluxFrom = flux[row - 1] + slope * (from - wavelengthUm[row - 1]);
      const fluxTo = flux[row - 1] + slope * (to - wavelengthUm[row - 1]);
      const riseFrom = (from - left) / width;
      const riseTo = (to - left) / width;
      const rising =
        ((to - from) / 6) * (2 * (fluxFrom * riseFrom + fluxTo * riseTo) + fluxFrom * riseTo + fluxTo * riseFrom);
      weights[cell] += rising;
      weights[cell - 1] += 0.5 * (to - from) * (fluxFrom + fluxTo) - rising;
      from = to;
    }
  }
  return weights;
}

/** A coarse hat is the fine hat of its own node plus, by distance, a share of the nodes that drop out beside it. */
function coarsen(fine: Float64Array, nodes: Float64Array, fineStride: number): Float64Array {
  const coarse = new Float64Array((fine.length - 1) / 2 + 1);
  for (let index = 0; index < coarse.length; index++) coarse[index] = fine[2 * index];
  for (let index = 1; index < fine.length; index += 2) {
    const left = nodes[(index - 1) * fineStride];
    const right = nodes[(index + 1) * fineStride];
    const rise = (nodes[index * fineStride] - left) / (right - left);
    coarse[(index - 1) / 2] += (1 - rise) * fine[index];
    coarse[(index + 1) / 2] += rise * fine[index];
  }
  return coarse;
}

function normalise(weights: Float64Array): void {
  let total = 0;
  for (const weight of weights) total += weight;
  for (let index = 0; index < weights.length; index++) weights[index] /= total;
}
