import { CatalogueFault } from './catalogue-fault';
import { isDecimalComma } from './not-a-number';
import type { RejectRow } from './reject-row';

const rowsWatched = 50;

/** When every one of the first rows is refused for a decimal comma, the whole file is refused with one clear advice. */
export class DecimalCommaWatch {
  #rows = 0;
  #withComma = 0;
  #firstLine: number | null = null;

  accepted(): void {
    this.#rows++;
  }

  rejected(problems: readonly RejectRow[]): void {
    this.#rows++;
    if (!problems.some(({ value }) => value !== null && isDecimalComma(value))) return;
    this.#firstLine ??= problems[0].line;
    this.#withComma++;
    if (this.#rows === rowsWatched) this.conclude();
  }

  /** To be called at the end of a file shorter than what is watched. */
  conclude(): void {
    if (this.#rows > rowsWatched || this.#withComma === 0 || this.#withComma < this.#rows) return;
    throw new CatalogueFault(
      'decimalComma',
      'The numbers are written with decimal commas (0,5). Save the file with decimal points (0.5), for example after setting the language of the spreadsheet to English.',
      this.#firstLine,
    );
  }
}
