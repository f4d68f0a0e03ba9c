/** The closed list of things that can be refused; everything else is a broken promise and is thrown as a plain Error. */
export const refusalStatus = {
  invalid: 400,
  unauthenticated: 401,
  forbidden: 403,
  notFound: 404,
  conflict: 409,
  tooLarge: 413,
  unsupported: 415,
  unprocessable: 422,
  tooMany: 429,
  unavailable: 503,
} as const;

export type RefusalKind = keyof typeof refusalStatus;

export type FieldProblem = { pointer?: string; row?: number; column?: string; detail: string };

/** An expected "no", with a sentence that can be shown to the person. */
export class Refusal extends Error {
  constructor(
    readonly kind: RefusalKind,
    message: string,
    readonly problems: FieldProblem[] = [],
    readonly retryAfterS?: number,
  ) {
    super(message);
    this.name = 'Refusal';
  }

  get status(): number {
    return refusalStatus[this.kind];
  }
}

/** Someone else's thing looks exactly like a thing that does not exist. */
export const notFound = (what: string): Refusal => new Refusal('notFound', `There is no such ${what}.`);
