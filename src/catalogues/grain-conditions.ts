import type { Condition } from '@/src/access/keyset';

export type GrainFilters = { material?: string; label?: string; radiusUmMin?: number; radiusUmMax?: number };

/** Limits include what a file wrote with the same digits, whatever the conversion to metres rounds. */
const slack = 1e-12;

/** Conditions on the table grain, known as g. */
export function grainConditions({ material, label, radiusUmMin, radiusUmMax }: GrainFilters): Condition[] {
  const conditions: Condition[] = [];
  if (material !== undefined) conditions.push({ sql: 'g.material = ?', values: [material] });
  if (label) conditions.push({ sql: `g.label ilike ? escape '\\'`, values: [`%${label.replace(/[\\%_]/g, '\\$&')}%`] });
  if (radiusUmMin !== undefined)
    conditions.push({ sql: 'g.radius_m >= ?', values: [radiusUmMin * 1e-6 * (1 - slack)] });
  if (radiusUmMax !== undefined)
    conditions.push({ sql: 'g.radius_m <= ?', values: [radiusUmMax * 1e-6 * (1 + slack)] });
  return conditions;
}
