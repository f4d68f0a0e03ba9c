import { CatalogueFault } from './catalogue-fault';
import { findRecordEnd } from './record-end';

/** Whole records, without the last line break; comment lines are emptied so that lines keep their numbers. */
export type RecordBlock = {
  text: string;
  line: number;
  hasQuotes: boolean;
  comments: { line: number; text: string }[];
};

export const maxRecordLength = 1024 * 1024;
const worthLookingAgain = 64 * 1024;
const hash = 35;

/**
 * Cuts text into blocks of whole records before the CSV parser sees it: an unbalanced quote would make the parser take the
 * rest of the file for one cell, in time that grows with the square of its length.
 */
export class RecordBlocks {
  #pending = '';
  #lengthSeen = 0;
  #line = 1;

  constructor(readonly delimiter: string) {}

  push(text: string): RecordBlock | null {
    this.#pending += text;
    return this.#pending.length - this.#lengthSeen < worthLookingAgain ? null : this.#cut(false);
  }

  /** The records that are complete although more text may follow. */
  completeSoFar(): RecordBlock | null {
    return this.#cut(false);
  }

  finish(): RecordBlock | null {
    return this.#pending === '' ? null : this.#cut(true);
  }

  #cut(isLast: boolean): RecordBlock | null {
    const text = this.#pending;
    const block: RecordBlock = { text: '', line: this.#line, hasQuotes: text.includes('"'), comments: [] };
    const kept: string[] = [];
    let keptTo = 0;
    let at = 0;
    let nextQuote = block.hasQuotes ? text.indexOf('"') : Infinity;
    while (at < text.length) {
      let end = text.indexOf('\n', at);
      if (end < 0 && isLast) end = text.length;
      const isComment = text.charCodeAt(at) === hash;
      if (nextQuote < at) nextQuote = orInfinity(text.indexOf('"', at));
      if (!isComment && (nextQuote < end || (end < 0 && nextQuote < Infinity)))
        end = this.#endOfQuoted(text, at, isLast);
      if (end < 0 || end - at > maxRecordLength) {
        if (text.length - at > maxRecordLength) throw longRecord(this.#line);
        break;
      }
      if (isComment) {
        block.comments.push({ line: this.#line, text: text.slice(at, end) });
        kept.push(text.slice(keptTo, at));
        keptTo = end;
      }
      this.#line += 1 + (nextQuote < end && !isComment ? lineBreaks(text, at, end) : 0);
      at = end + 1;
    }
    this.#pending = text.slice(at);
    this.#lengthSeen = this.#pending.length;
    if (at === 0) return null;
    kept.push(text.slice(keptTo, at - 1));
    block.text = kept.join('');
    return block;
  }

  #endOfQuoted(text: string, from: number, isLast: boolean): number {
    const found = findRecordEnd(text, from, this.delimiter, isLast);
    if (found.kind === 'ended') return found.at;
    if (found.kind === 'unfinished') return -1;
    const line = this.#line + lineBreaks(text, from, found.kind === 'strayQuote' ? found.at : found.openedAt);
    const began = line === this.#line ? '' : ` (the row begins on line ${this.#line})`;
    if (found.kind === 'strayQuote')
      throw new CatalogueFault(
        'strayQuote',
        `On line ${line}${began} a quotation mark closes a cell before the cell is over. Write a quotation mark inside a quoted cell twice.`,
        line,
      );
    if (!isLast && text.length - from <= maxRecordLength) return -1;
    throw new CatalogueFault('unclosedQuote', `A quotation mark opened on line ${line}${began} is never closed.`, line);
  }
}

const orInfinity = (index: number) => (index < 0 ? Infinity : index);

function longRecord(line: number): CatalogueFault {
  return new CatalogueFault(
    'longRecord',
    `The row that begins on line ${line} is longer than 1 MiB. Is the file a table with line breaks?`,
    line,
  );
}

function lineBreaks(text: string, from: number, to: number): number {
  let breaks = 0;
  for (let at = text.indexOf('\n', from); at >= 0 && at < to; at = text.indexOf('\n', at + 1)) breaks++;
  return breaks;
}
