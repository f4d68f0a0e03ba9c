/** Turns CR LF and lone CR into LF across pieces of text, so that a line is a line whoever wrote the file. */
export class LineEndings {
  #heldReturn = '';

  push(text: string, isLast: boolean): string {
    const whole = this.#heldReturn + text;
    this.#heldReturn = !isLast && whole.endsWith('\r') ? '\r' : '';
    const body = this.#heldReturn ? whole.slice(0, -1) : whole;
    return body.includes('\r') ? body.replace(/\r\n?/g, '\n') : body;
  }
}
