/** How a record that contains quotes ends: at a line break, not yet, or never in a way that can be read. */
export type RecordEnd =
  | { kind: 'ended'; at: number }
  | { kind: 'unfinished' }
  | { kind: 'openQuote'; openedAt: number }
  | { kind: 'strayQuote'; at: number };

const newline = 10;
const quote = 34;
const blank = 32;

/** Follows the quotes of one record (RFC 4180): a quote opens only at the start of a cell, a doubled one is a quote mark. */
export function findRecordEnd(text: string, from: number, delimiter: string, isLast: boolean): RecordEnd {
  const separator = delimiter.charCodeAt(0);
  let at = from;
  for (;;) {
    if (text.charCodeAt(at) === quote) {
      const closedAt = findClosingQuote(text, at);
      if (closedAt < 0) return { kind: 'openQuote', openedAt: at };
      let after = closedAt + 1;
      while (separator !== blank && text.charCodeAt(after) === blank) after++;
      if (after >= text.length) return isLast ? { kind: 'ended', at: text.length } : { kind: 'unfinished' };
      const next = text.charCodeAt(after);
      if (next === newline) return { kind: 'ended', at: after };
      if (next !== separator) return { kind: 'strayQuote', at: closedAt };
      at = after + 1;
    } else {
      let end = at;
      while (end < text.length && text.charCodeAt(end) !== separator && text.charCodeAt(end) !== newline) end++;
      if (end >= text.length) return isLast ? { kind: 'ended', at: text.length } : { kind: 'unfinished' };
      if (text.charCodeAt(end) === newline) return { kind: 'ended', at: end };
      at = end + 1;
    }
  }
}

function findClosingQuote(text: string, openedAt: number): number {
  let at = text.indexOf('"', openedAt + 1);
  while (at >= 0 && text.charCodeAt(at + 1) === quote) at = text.indexOf('"', at + 2);
  return at;
}
