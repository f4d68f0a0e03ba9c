/** Nodes on (-1, 1) ascending and weights of the Gauss-Legendre rule with `count` points, to rounding (Newton on P_n). */
export function gaussLegendre(count: number): { nodes: Float64Array; weights: Float64Array } {
  const nodes = new Float64Array(count);
  const weights = new Float64Array(count);
  for (let index = 0; index < count; index++) {
    let root = -Math.cos((Math.PI * (index + 0.75)) / (count + 0.5));
    let slope = 1;
    for (let iteration = 0; iteration < 100; iteration++) {
      const [value, derivative] = legendre(count, root);
      slope = derivative;
      const step = value / derivative;
      root -= step;
      if (Math.abs(step) < 1e-15) break;
    }
    nodes[index] = root;
    weights[index] = 2 / ((1 - root * root) * slope * slope);
  }
  return { nodes, weights };
}

function legendre(degree: number, x: number): [number, number] {
  let previous = 1;
  let current = x;
  for (let order = 2; order <= degree; order++) {
    [previous, current] = [current, ((2 * order - 1) * x * current - (order - 1) * previous) / order];
  }
  return [current, (degree * (x * current - previous)) / (x * x - 1)];
}
