import type { Clarity } from './clarity';

/** What a reader of the curve should know, in sentences. */
export function curveNotes(shareOutside: number, capped: boolean, kind: Clarity['kind']): string[] {
  const notes: string[] = [];
  if (shareOutside > 0.01) {
    const percent = (100 * shareOutside).toFixed(1);
    notes.push(
      `${percent} % of the star's energy lies outside the wavelengths for which the optical constants are vouched for.`,
    );
  }
  if (kind === 'clear') {
    notes.push(
      'The material is transparent where the star shines: narrow resonances limit the mean efficiency to about 0.1 %.',
    );
  }
  if (capped) {
    notes.push(
      'At some radii the wavelength refinement ended at its limit before the tolerance was met; the error bound says so.',
    );
  }
  return notes;
}
