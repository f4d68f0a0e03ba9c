import { whyOutOfRange } from './allowed-range';
import type { ColumnField } from './mapping';
import { columnFor, type ColumnPlan, type PlannedColumn } from './column-plan';
import type { GrainRow } from './grain-row';
import { materialReader } from './material-reader';
import { settleGrain, type Measured } from './measured-grain';
import { whyNotANumber } from './not-a-number';
import { parseNumber } from './number';
import { defaultDensityKgM3, type ReadOptions } from './read-options';
import { cut, rawOf, type RejectRow } from './reject-row';
import { toSi } from './units';

const maxLabelLength = 200;

/** Reads rows of one plan: a grain, or every reason why the row is not one. */
export function rowChecker(plan: ColumnPlan, width: number, options: ReadOptions, delimiter: string) {
  const column = (field: ColumnField) => columnFor(plan, field);
  const [radius, diameter, mass, density] = [column('radius'), column('diameter'), column('mass'), column('density')];
  const [radiusSigma, diameterSigma] = [column('radiusSigma'), column('diameterSigma')];
  const [massSigma, densitySigma] = [column('massSigma'), column('densitySigma')];
  const [label, count] = [column('label'), column('count')];
  const readMaterial = materialReader(column('material'), options);
  const defaultDensity = defaultDensityKgM3(options);

  return (cells: string[], line: number): GrainRow | RejectRow[] => {
    const problems: RejectRow[] = [];
    const refuse = (at: string | null, value: string | null, reason: string) =>
      problems.push({
        line,
        column: at,
        value: value === null ? null : cut(value),
        reason,
        raw: rawOf(cells, delimiter),
      });

    if (cells.length !== width) {
      refuse(null, null, raggedReason(cells, width, delimiter));
      return problems;
    }
    const read = (from: PlannedColumn | null): number | null => {
      if (!from) return null;
      const cell = cells[from.index];
      const value = parseNumber(cell);
      if (Number.isNaN(value)) {
        if (cell.trim() !== '') refuse(from.header, cell, whyNotANumber(cell));
        return null;
      }
      const valueSi = from.unit ? toSi(value, from.unit) : value;
      const reason = whyOutOfRange(from.field, valueSi);
      if (reason === null) return valueSi;
      refuse(from.header, cell, reason);
      return null;
    };
    const measured: Measured = {
      radiusM: read(radius),
      radiusSigmaM: read(radiusSigma),
      diameterM: read(diameter),
      diameterSigmaM: read(diameterSigma),
      massKg: read(mass),
      massSigmaKg: read(massSigma),
      densityKgM3: read(density),
      densitySigmaKgM3: read(densitySigma),
    };
    const rowCount = read(count) ?? 1;
    const rowLabel = label ? cells[label.index].trim() : '';
    if (label && rowLabel.length > maxLabelLength)
      refuse(label.header, rowLabel, `is longer than ${maxLabelLength} characters`);
    const material = readMaterial(cells, refuse);
    if (problems.length > 0 || material === null) return problems;

    const numbers = settleGrain(measured, defaultDensity);
    if ('reason' in numbers) {
      const at = column(numbers.field);
      refuse(at?.header ?? null, at ? cells[at.index] : null, numbers.reason);
      return problems;
    }
    return {
      line,
      label: rowLabel === '' ? null : rowLabel,
      radiusM: numbers.radiusM,
      radiusSigmaM: numbers.radiusSigmaM,
      densityKgM3: numbers.densityKgM3,
      densitySigmaKgM3: numbers.densitySigmaKgM3,
      material,
      count: rowCount,
    };
  };
}

function raggedReason(cells: readonly string[], width: number, delimiter: string): string {
  const seen = `the row has ${cells.length} ${cells.length === 1 ? 'cell' : 'cells'} where the header has ${width}`;
  return delimiter === ',' && cells.length > width
    ? `${seen}: if its commas are decimal commas, write 0.5 instead of 0,5`
    : seen;
}
