import { CatalogueFault } from './catalogue-fault';
import type { ColumnMapping } from './mapping';
import type { PlannedColumn, Warning } from './column-plan';
import { readHeaderName } from './header-name';
import { quantityOf } from './measured-field';
import { findUnit, unitSymbols, type Quantity } from './units';

const oneOf = (quantity: Quantity) => unitSymbols(quantity).join(', ');

export function planMappedColumn(
  header: string,
  index: number,
  entry: ColumnMapping[string],
  line: number,
): PlannedColumn {
  const { field, unit: unitText } = entry;
  const quantity = quantityOf[field];
  if (!quantity) return { index, header, field, unit: null };
  if (unitText !== undefined) {
    const unit = findUnit(unitText, quantity);
    if (unit) return { index, header, field, unit };
    throw new CatalogueFault(
      'unitUnknown',
      `Column "${header}": "${unitText}" is not a unit of ${quantity}. Known: ${oneOf(quantity)}.`,
      line,
      header,
    );
  }
  const reading = readHeaderName(header);
  if (reading.kind === 'column' && reading.unit?.quantity === quantity)
    return { index, header, field, unit: reading.unit };
  throw new CatalogueFault(
    'unitMissing',
    `Column "${header}" is mapped to ${field}: say its unit (${oneOf(quantity)}).`,
    line,
    header,
  );
}

export function planNamedColumn(header: string, index: number, line: number, warnings: Warning[]): PlannedColumn {
  const reading = readHeaderName(header);
  if (reading.kind === 'column') return { index, header, field: reading.field, unit: reading.unit };
  if (reading.kind === 'unitMissing') {
    const quantity = quantityOf[reading.field] as Quantity;
    const example = unitSymbols(quantity).includes('um') ? 'um' : unitSymbols(quantity)[0];
    throw new CatalogueFault(
      'unitMissing',
      `Column "${header}" has no unit: say the unit in the header, as in "${header} (${example})", or in the mapping (${oneOf(quantity)}).`,
      line,
      header,
    );
  }
  if (reading.kind === 'unitUnknown') {
    const known = oneOf(quantityOf[reading.field] as Quantity);
    throw new CatalogueFault(
      'unitUnknown',
      `Column "${header}": the unit "${reading.unitText}" is not known. Known: ${known}.`,
      line,
      header,
    );
  }
  if (reading.kind === 'radiusOrDiameter')
    throw new CatalogueFault(
      'radiusOrDiameter',
      `Column "${header}" does not say whether it holds a radius or a diameter: call it radius_um or diameter_um (or another unit), or say so in the mapping.`,
      line,
      header,
    );
  warnings.push(ignoredColumn(header, index, reading.kind === 'errorOfUnknownKind'));
  return { index, header, field: 'ignore', unit: null };
}

function ignoredColumn(header: string, index: number, looksLikeError: boolean): Warning {
  if (header === '') return { code: 'ignoredColumn', message: `Column ${index + 1} has no name and was ignored.` };
  const hint = looksLikeError ? ' If it is a one-sigma error, call it like its column with _sigma at the end.' : '';
  return { code: 'ignoredColumn', message: `Column "${header.slice(0, 60)}" is not known and was ignored.${hint}` };
}
