import { shippedMaterials } from '@/fixtures/materials/library';
import { buildCurve } from '@/src/physics/curve';
import { opticsFromLibraryEntry } from '@/src/physics/materials';
import { mieInto } from '@/src/physics/mie';
import type { Line } from './bench';
import { alternating } from './timing';

const chosen = ['carbon_be', 'astrosil', 'water_ice'];
/** Radii per decade, decades and wavelengths of a grid without any adaptivity; a twentieth of it is timed. */
const brute = { radii: 240, wavelengths: 512, part: 20 };

/** Building a curve beside a fixed grid of Mie calls to 1 mm. */
export function benchCurves(): Line[] {
  const out = new Float64Array(5);
  const floor = () => {
    for (let call = 0; call < (brute.radii * brute.wavelengths) / brute.part; call += 1) {
      const radiusUm = 1e-3 * 10 ** ((6 * (call % brute.radii)) / brute.radii);
      mieInto(out, (2 * Math.PI * Math.min(radiusUm, 100)) / 0.6, 1.7, 0.03);
    }
  };
  return shippedMaterials()
    .filter(({ id }) => chosen.includes(id))
    .map((entry) => {
      const core = opticsFromLibraryEntry(entry);
      const { seconds, ratio } = alternating(
        () => void buildCurve({ core }, { kind: 'planck', teffK: 5772 }),
        floor,
        3,
      );
      return {
        what: `curve of ${entry.name}, 1 nm to 1 cm`,
        value: seconds * 1000,
        unit: 'ms',
        floor: `fixed grid ${brute.radii} x ${brute.wavelengths}`,
        ratio: ratio / brute.part,
      };
    });
}
