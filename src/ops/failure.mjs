/** Something the person at the keyboard can act on: shown as its one sentence, without a stack trace. */
export class Failure extends Error {
  /** @param {string} sentence @param {string} [log] path of the log that tells more */
  constructor(sentence, log) {
    super(sentence);
    this.log = log;
  }
}

export function describeFailure(error) {
  if (!(error instanceof Failure)) return error instanceof Error ? (error.stack ?? error.message) : String(error);
  return error.log ? `${error.message}\nDetails: ${error.log}` : error.message;
}

export function exitWithFailure(error) {
  console.error(describeFailure(error));
  process.exit(1);
}
