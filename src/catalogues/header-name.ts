import type { ColumnField } from './mapping';
import { quantityOf, sigmaFieldOf } from './measured-field';
import { findUnit, type Unit } from './units';

/** What a header says on its own; nothing is guessed: a missing unit stays missing. */
export type HeaderReading =
  | { kind: 'column'; field: ColumnField; unit: Unit | null }
  | { kind: 'unitMissing'; field: ColumnField }
  | { kind: 'unitUnknown'; field: ColumnField; unitText: string }
  | { kind: 'radiusOrDiameter' }
  | { kind: 'errorOfUnknownKind' }
  | { kind: 'unknown' };

const fieldWords: ReadonlyMap<string, ColumnField> = new Map([
  ['label', 'label'],
  ['id', 'label'],
  ['name', 'label'],
  ['grain_id', 'label'],
  ['radius', 'radius'],
  ['diameter', 'diameter'],
  ['mass', 'mass'],
  ['density', 'density'],
  ['material', 'material'],
  ['composition', 'material'],
  ['count', 'count'],
]);

const bracketedUnit = /^(.*?)[([]([^()[\]]*)[)\]]\s*(.*)$/;

/** Lower case, one kind of micro sign, words joined by underscores. */
const plain = (text: string) =>
  text
    .normalize('NFKC')
    .toLowerCase()
    .replaceAll('\u03bc', 'u')
    .trim()
    .replace(/[\s_]+/g, '_')
    .replace(/^_+|_+$/g, '');

export function readHeaderName(header: string): HeaderReading {
  const bracketed = bracketedUnit.exec(header);
  const words = plain(bracketed ? `${bracketed[1]} ${bracketed[3]}` : header);
  const isSigma = words.endsWith('_sigma');
  const name = isSigma ? words.slice(0, -'_sigma'.length) : words;
  const exact = fieldWords.get(name);
  if (exact) return withUnit(exact, isSigma, bracketed?.[2] ?? null, true);
  if (!bracketed) {
    for (const [word, field] of fieldWords) {
      if (quantityOf[field] && name.startsWith(`${word}_`)) {
        const reading = withUnit(field, isSigma, name.slice(word.length + 1), false);
        if (reading.kind === 'column') return reading;
      }
    }
  }
  if (/^(grain_|particle_)?size(_|$)/.test(name)) return { kind: 'radiusOrDiameter' };
  return { kind: /_(err|error|unc|uncertainty|sd|std|e)$|^e_|^err_/.test(words) ? 'errorOfUnknownKind' : 'unknown' };
}

function withUnit(base: ColumnField, isSigma: boolean, unitText: string | null, unitIsSure: boolean): HeaderReading {
  const field = isSigma ? sigmaFieldOf.get(base) : base;
  if (!field) return { kind: 'unknown' };
  const quantity = quantityOf[field];
  if (!quantity) return { kind: 'column', field, unit: null };
  if (unitText === null || unitText.trim() === '') return { kind: 'unitMissing', field };
  const unit = findUnit(unitText, quantity);
  if (unit) return { kind: 'column', field, unit };
  return unitIsSure ? { kind: 'unitUnknown', field, unitText: unitText.trim() } : { kind: 'unknown' };
}
