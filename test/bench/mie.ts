import { mieInto } from '@/src/physics/mie';
import type { Line } from './bench';
import { textbookMie } from './textbook-mie';
import { alternating } from './timing';

const indices = [
  [1.7, 0.03],
  [2, 0.8],
  [1.31, 1e-8],
] as const;
const sizes = [0.1, 1, 10, 100, 1000];

/** The kernel beside the textbook's algorithm (Bohren & Huffman, appendix A, with the safe start) in the same language. */
export function benchMie(): Line[] {
  const out = new Float64Array(5);
  return indices.flatMap(([n, k]) =>
    sizes.map((x) => {
      const calls = Math.max(20, Math.round(40_000 / (x + 10)));
      const repeat = (one: () => void) => () => {
        for (let call = 0; call < calls; call += 1) one();
      };
      const { seconds, ratio } = alternating(
        repeat(() => mieInto(out, x, n, k)),
        repeat(() => textbookMie(out, x, n, k)),
      );
      return {
        what: `Mie, m = ${n} + ${k}i, x = ${x}`,
        value: (seconds / calls) * 1e9,
        unit: 'ns/call',
        floor: 'textbook algorithm',
        ratio,
      };
    }),
  );
}
