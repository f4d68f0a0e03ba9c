import type { PreparedMaterial, PreparedRun } from './prepare-run';
import { greatestPorosity } from './porosity-nodes';

const fewRows = 20;
const bulkOpticsFromM = 5e-9;

/** What a reader of the answer should know, in sentences. */
export function runWarnings(
  { inputs, materials }: PreparedRun,
  { rows, effectiveRows }: { rows: number; effectiveRows: number },
): string[] {
  const warnings: string[] = [];
  const all = [...materials.values()];
  for (const { frozen, nodes } of all) {
    for (const note of new Set(nodes.flatMap(({ curve }) => curve.notes))) warnings.push(`${frozen.name}: ${note}`);
  }
  if (inputs.optics.porosity === 'fromDensity') warnings.push(...all.flatMap(porosityWarnings));
  if (all.some(({ population }) => population.leastRadiusM < bulkOpticsFromM)) {
    warnings.push('Some grains are smaller than 5 nm: bulk optical constants are doubtful there.');
  }
  if (effectiveRows < fewRows && rows > 0) {
    const carried = effectiveRows.toFixed(1);
    warnings.push(
      `The shares rest on few grains: weighted with the counts, the catalogue is worth ${carried} independent rows.`,
    );
  }
  return warnings;
}

function porosityWarnings({ frozen, population }: PreparedMaterial): string[] {
  const warnings: string[] = [];
  const gramsPerCm3 = (frozen.densityKgM3 / 1000).toPrecision(4);
  if (population.greatestDensityKgM3 > frozen.densityKgM3) {
    warnings.push(
      `${frozen.name}: grains denser than the compact material (${gramsPerCm3} g/cm3) are treated as compact.`,
    );
  }
  if (population.leastDensityKgM3 < (1 - greatestPorosity) * frozen.densityKgM3) {
    warnings.push(
      `${frozen.name}: grains with more than ${100 * greatestPorosity} % vacuum are treated as having ${100 * greatestPorosity} %.`,
    );
  }
  return warnings;
}
