import { csvLine } from '@/src/csv-line';
import type { RejectRow } from './reject-row';

export const rejectsCsvHeader = csvLine(['line', 'column', 'value', 'reason', 'row']);

export const rejectToCsvLine = (reject: RejectRow): string =>
  csvLine([reject.line, reject.column, reject.value, reject.reason, reject.raw]);
