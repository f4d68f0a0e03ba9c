import { CatalogueFault } from './catalogue-fault';
import { columnFor, type ColumnPlan } from './column-plan';
import type { ReadOptions } from './read-options';

/** Where values come from that the file does not carry; a file that nobody can complete is refused here, not row by row. */
export function checkRequiredColumns(plan: ColumnPlan, options: ReadOptions, line: number): void {
  if (!columnFor(plan, 'material') && options.defaults?.material === undefined)
    throw new CatalogueFault(
      'materialMissing',
      'There is no material column: add one, or give a default material.',
      line,
    );
  if (columnFor(plan, 'density') || options.defaults?.densityGCm3 !== undefined) return;
  const sizeAndMass = columnFor(plan, 'mass') && (columnFor(plan, 'radius') || columnFor(plan, 'diameter'));
  if (sizeAndMass) return;
  throw new CatalogueFault('densityMissing', 'There is no density column: add one, or give a default density.', line);
}
