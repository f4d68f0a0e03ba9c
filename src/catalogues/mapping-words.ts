import { z } from 'zod';
import { readHeaderName } from './header-name';
import { columnMapping } from './mapping';

/** A mapping as people send it: a column may also be told by one of the understood headers, such as "diameter_um". */
export const mappingWords = z
  .record(z.string().max(200), z.unknown())
  .transform((mapping, context) => {
    const entries = Object.entries(mapping).map(([column, told]) => {
      if (typeof told !== 'string') return [column, told];
      if (told === 'ignore') return [column, { field: 'ignore' }];
      const reading = readHeaderName(told);
      if (reading.kind === 'column')
        return [column, { field: reading.field, ...(reading.unit ? { unit: reading.unit.symbol } : {}) }];
      context.addIssue({ code: 'custom', path: [column], message: `"${told}" is not one of the understood names` });
      return [column, told];
    });
    return Object.fromEntries(entries) as unknown;
  })
  .pipe(columnMapping);
