import { CatalogueFault } from './catalogue-fault';
import type { ColumnPlan, Warning } from './column-plan';
import { withCommentedHeaderHint } from './commented-header';
import { GrainWarnings } from './grain-warnings';
import type { GrainRow } from './grain-row';
import { isBlankRow, linesOf, parseBlock } from './parse-block';
import { planColumns } from './plan-columns';
import type { ReadOptions } from './read-options';
import type { RecordBlock } from './record-blocks';
import type { RejectRow } from './reject-row';
import { checkRequiredColumns } from './required-columns';
import { rowChecker } from './row-checker';
import { DecimalCommaWatch } from './decimal-comma-watch';

/** Of each block before the header: enough to find a header that was made a comment. */
const commentsKept = 50;

type CheckRow = ReturnType<typeof rowChecker>;

/** Turns blocks of records into grains and rejects, one after the other; knows the header once it has seen it. */
export class RowReader {
  #check: CheckRow | null = null;
  #width = 0;
  #headerLine = 0;
  #warnings: Warning[] = [];
  #grainWarnings = new GrainWarnings();
  #commas = new DecimalCommaWatch();
  #commentsBefore: RecordBlock['comments'] = [];
  #commentsLikeRows = 0;
  columns: ColumnPlan = [];
  accepted = 0;
  rejected = 0;
  blank = 0;

  constructor(
    readonly delimiter: string,
    readonly options: ReadOptions,
  ) {}

  *read(block: RecordBlock): Generator<GrainRow | RejectRow[]> {
    if (!this.#check) this.#commentsBefore.push(...block.comments.slice(0, commentsKept));
    let line = block.line;
    for (const cells of parseBlock(block, this.delimiter)) {
      if (isBlankRow(cells)) this.blank++;
      else if (this.#check) yield this.#row(cells, line, this.#check);
      else this.#header(cells, line);
      line += linesOf(cells, block.hasQuotes);
    }
    for (const comment of block.comments)
      if (
        comment.line > this.#headerLine &&
        this.#width > 1 &&
        comment.text.split(this.delimiter).length === this.#width
      )
        this.#commentsLikeRows++;
  }

  finish(): Warning[] {
    if (!this.#check) throw new CatalogueFault('empty', 'The file has no header and no rows.');
    if (this.accepted + this.rejected === 0)
      throw new CatalogueFault('noRows', 'The file has a header but no rows below it.', this.#headerLine);
    this.#commas.conclude();
    if (this.#commentsLikeRows > 0)
      this.#warnings.push({
        code: 'commentsLikeRows',
        message: `${this.#commentsLikeRows} lines that begin with # look like rows but were left out as comments.`,
      });
    return [...this.#warnings, ...this.#grainWarnings.all()];
  }

  #header(cells: string[], line: number): void {
    const planned = withCommentedHeaderHint(this.#commentsBefore, this.delimiter, () =>
      planColumns(cells, this.options.mapping, line),
    );
    this.columns = planned.columns;
    checkRequiredColumns(planned.columns, this.options, line);
    this.#warnings = planned.warnings;
    this.#check = rowChecker(planned.columns, cells.length, this.options, this.delimiter);
    this.#width = cells.length;
    this.#headerLine = line;
    this.#commentsBefore = [];
  }

  #row(cells: string[], line: number, check: CheckRow): GrainRow | RejectRow[] {
    if (this.accepted + this.rejected >= this.options.maxRows)
      throw new CatalogueFault(
        'tooManyRows',
        `The file has more than ${this.options.maxRows} rows, which is the most that is accepted.`,
        line,
      );
    const checked = check(cells, line);
    if (Array.isArray(checked)) {
      this.rejected++;
      this.#commas.rejected(checked);
    } else {
      this.accepted++;
      this.#commas.accepted();
      this.#grainWarnings.see(checked);
    }
    return checked;
  }
}
