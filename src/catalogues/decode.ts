import { CatalogueFault } from './catalogue-fault';
import { binaryKind, signatureLength } from './file-signature';
import { incompleteTail, firstInvalidByte } from './utf8';

type Encoding = 'utf-8' | 'utf-16le' | 'utf-16be';

const nul = '\0';
const advice = 'Save the file as CSV with the encoding UTF-8 and upload it again.';

/** Bytes of a file, in pieces of any size, to text; what is not text is refused with a sentence. */
export class TextDecoding {
  #start: Uint8Array | null = new Uint8Array(0);
  #decoder = new TextDecoder('utf-8', { fatal: true });
  #unfinished = new Uint8Array(0);
  #bytesBefore = 0;
  #linesBefore = 0;
  encoding: Encoding = 'utf-8';

  push(bytes: Uint8Array): string {
    if (!this.#start) return this.#decode(bytes);
    const start = joined(this.#start, bytes);
    if (start.length < signatureLength) {
      this.#start = start;
      return '';
    }
    return this.#begin(start);
  }

  finish(): string {
    const begun = this.#start ? this.#begin(this.#start) : '';
    try {
      return begun + this.#decoder.decode();
    } catch (cause) {
      if (!(cause instanceof TypeError)) throw cause;
      throw new CatalogueFault(
        'encoding',
        `The file ends in the middle of a ${this.encoding} character. It may have been cut off.`,
      );
    }
  }

  #begin(start: Uint8Array): string {
    this.#start = null;
    const kind = binaryKind(start);
    if (kind) throw new CatalogueFault('binary', kind);
    if (start[0] === 0xff && start[1] === 0xfe) this.encoding = 'utf-16le';
    if (start[0] === 0xfe && start[1] === 0xff) this.encoding = 'utf-16be';
    this.#decoder = new TextDecoder(this.encoding, { fatal: true });
    return this.#decode(start);
  }

  #decode(bytes: Uint8Array): string {
    let text: string;
    try {
      text = this.#decoder.decode(bytes, { stream: true });
    } catch (cause) {
      if (!(cause instanceof TypeError)) throw cause;
      throw this.#notText(bytes);
    }
    if (text.includes(nul))
      throw new CatalogueFault('binary', `The file contains NUL bytes, so it is not a text file in UTF-8. ${advice}`);
    for (let at = bytes.indexOf(10); at >= 0; at = bytes.indexOf(10, at + 1)) this.#linesBefore++;
    this.#bytesBefore += bytes.length;
    if (this.encoding === 'utf-8') this.#unfinished = incompleteTail(joined(this.#unfinished, bytes.subarray(-3)));
    return text;
  }

  #notText(bytes: Uint8Array): CatalogueFault {
    if (this.encoding !== 'utf-8')
      return new CatalogueFault('encoding', `The file is not valid ${this.encoding} text. ${advice}`);
    const window = joined(this.#unfinished, bytes);
    const at = firstInvalidByte(window);
    let line = this.#linesBefore + 1;
    for (const byte of window.subarray(0, at)) if (byte === 10) line++;
    const offset = this.#bytesBefore - this.#unfinished.length + at;
    const message = `The file is not UTF-8 text: byte ${offset + 1} of the file, on line ${line}, is not part of a character. ${advice}`;
    return new CatalogueFault('encoding', message, line);
  }
}

function joined(a: Uint8Array, b: Uint8Array): Uint8Array<ArrayBuffer> {
  const both = new Uint8Array(a.length + b.length);
  both.set(a);
  both.set(b, a.length);
  return both;
}
