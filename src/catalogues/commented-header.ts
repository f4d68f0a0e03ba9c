import { CatalogueFault } from './catalogue-fault';
import { readHeaderName } from './header-name';

type Comment = { line: number; text: string };

const maxNamesRead = 64;

function namesASize({ text }: Comment, delimiter: string): boolean {
  const names = text.replace(/^#+/, '').trim().split(delimiter).slice(0, maxNamesRead);
  return names.some((name) => {
    const reading = readHeaderName(name.trim());
    return reading.kind === 'column' && ['radius', 'diameter', 'mass'].includes(reading.field);
  });
}

/** Some programs put a # before the header: when no size is found, the comment that names one is pointed out. */
export function withCommentedHeaderHint<T>(comments: readonly Comment[], delimiter: string, plan: () => T): T {
  try {
    return plan();
  } catch (fault) {
    if (!(fault instanceof CatalogueFault) || fault.code !== 'sizeMissing') throw fault;
    const header = comments.find((comment) => namesASize(comment, delimiter));
    if (!header) throw fault;
    const hint = `The comment on line ${header.line} looks like the header: remove its #.`;
    throw new CatalogueFault('sizeMissing', `${fault.message} ${hint}`, header.line);
  }
}
