import type { RunInputs } from '@/entities/run-inputs';
import type { RunItem } from '@/src/runs/schema';

/** The API passes the frozen inputs through as they are stored. */
export const inputsOf = (run: Pick<RunItem, 'inputs'>): RunInputs => run.inputs as RunInputs;

/** A star as it reads after "of". */
export function starInWords({ slug, name, massSun, luminositySun, teffK }: RunInputs['star']): string {
  if (slug === 'sun') return 'the Sun';
  if (slug !== null) return name;
  return `a star of ${massSun} M☉, ${luminositySun} L☉ and ${teffK} K`;
}
