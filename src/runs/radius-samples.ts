/** Radii (um) from 1 nm to 1 cm, even in the logarithm: fine enough to draw every bend of a curve. */
const perDecade = 40;
const decades = 7;

export const radiusSamplesUm: readonly number[] = Array.from({ length: perDecade * decades + 1 }, (_, index) =>
  Number((1e-3 * 10 ** (index / perDecade)).toPrecision(12)),
);
