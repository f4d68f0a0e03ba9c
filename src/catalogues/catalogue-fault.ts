export type CatalogueFaultCode =
  | 'empty'
  | 'binary'
  | 'encoding'
  | 'unclosedQuote'
  | 'strayQuote'
  | 'longRecord'
  | 'noRows'
  | 'tooManyRows'
  | 'tooManyColumns'
  | 'duplicateHeader'
  | 'duplicateField'
  | 'unitMissing'
  | 'unitUnknown'
  | 'radiusOrDiameter'
  | 'sizeMissing'
  | 'densityMissing'
  | 'materialMissing'
  | 'mapping'
  | 'defaults'
  | 'decimalComma';

/** The file as a whole cannot be read; the message is a sentence for the person who uploaded it. */
export class CatalogueFault extends Error {
  constructor(
    readonly code: CatalogueFaultCode,
    message: string,
    readonly line: number | null = null,
    readonly column: string | null = null,
  ) {
    super(message);
    this.name = 'CatalogueFault';
  }
}
