import { L_SUN, R_SUN, SIGMA_SB } from '@/src/physics/constants';
import type { StarDraft } from './star-draft-schema';

const mostRadiusMismatch = 0.1;
const mostDexFromMainSequence = 1;

/** What should make somebody look again before publishing; nothing of it is refused. */
export function starCautions({
  massSun,
  luminositySun,
  teffK,
  radiusSun,
}: Pick<StarDraft, 'massSun' | 'luminositySun' | 'teffK' | 'radiusSun'>): string[] {
  const cautions: string[] = [];
  if (radiusSun) {
    const implied = Math.sqrt((luminositySun * L_SUN) / (4 * Math.PI * SIGMA_SB * teffK ** 4)) / R_SUN;
    if (Math.abs(radiusSun / implied - 1) > mostRadiusMismatch) {
      cautions.push(
        `Luminosity and temperature imply a radius of ${implied.toPrecision(3)} solar radii, not ${radiusSun}.`,
      );
    }
  }
  const dex = Math.log10(luminositySun / mainSequenceLuminositySun(massSun));
  if (Math.abs(dex) > mostDexFromMainSequence) {
    cautions.push(
      `For its mass the star is ${Math.abs(dex).toFixed(1)} dex ${dex > 0 ? 'brighter' : 'fainter'} than the main sequence.`,
    );
  }
  return cautions;
}

/** Rough mass-luminosity relation of dwarfs (common practice: L ~ M^3.5, flatter below 0.43 solar masses). */
function mainSequenceLuminositySun(massSun: number): number {
  return massSun < 0.43 ? 0.23 * massSun ** 2.3 : massSun ** 3.5;
}
