import type { Warning } from './column-plan';
import type { GrainRow } from './grain-row';

const smallM = 5e-9;
const largeM = 1e-3;
const lightKgM3 = 50;
const heavyKgM3 = 9000;
/** sigma_ln = sqrt(ln(1 + (ds/s)^2)) is 2 here. */
const wildRelativeSigma = Math.sqrt(Math.expm1(4));

/** Counts grains that are possible but deserve a second look, and says so once for each kind. */
export class GrainWarnings {
  #small = 0;
  #large = 0;
  #oddDensity = 0;
  #wildSigma = 0;

  see(grain: GrainRow): void {
    if (grain.radiusM < smallM) this.#small++;
    else if (grain.radiusM > largeM) this.#large++;
    if (grain.densityKgM3 < lightKgM3 || grain.densityKgM3 > heavyKgM3) this.#oddDensity++;
    if (grain.radiusSigmaM !== null && grain.radiusSigmaM > wildRelativeSigma * grain.radiusM) this.#wildSigma++;
  }

  all(): Warning[] {
    const said = (code: string, grains: number, what: string): Warning[] =>
      grains === 0 ? [] : [{ code, message: `${grains} ${grains === 1 ? 'grain' : 'grains'} ${what}` }];
    return [
      ...said(
        'smallGrains',
        this.#small,
        'with a radius below 5 nm: bulk optical constants are doubtful there. Check the unit.',
      ),
      ...said('largeGrains', this.#large, 'with a radius above 1 mm: starlight hardly moves them. Check the unit.'),
      ...said('oddDensities', this.#oddDensity, 'with a density outside 0.05 to 9 g/cm3. Check the unit.'),
      ...said(
        'wildErrors',
        this.#wildSigma,
        'with a size error so large that its logarithm spreads by more than 2 (one sigma).',
      ),
    ];
  }
}
