import { CatalogueFault } from './catalogue-fault';
import { TextDecoding } from './decode';
import { LineEndings } from './line-endings';

/** A chunk of any size is parsed piece by piece, so that memory does not depend on how the file arrives. */
const pieceBytes = 256 * 1024;

/** Bytes to text in which every line ends with LF; a file of nothing but blanks is refused. */
export async function* textPieces(bytes: AsyncIterable<Uint8Array>): AsyncGenerator<string> {
  const decoding = new TextDecoding();
  const lineEndings = new LineEndings();
  let isEmpty = true;
  for await (const chunk of bytes) {
    for (let at = 0; at < chunk.length; at += pieceBytes) {
      const text = lineEndings.push(decoding.push(chunk.subarray(at, at + pieceBytes)), false);
      if (text === '') continue;
      isEmpty &&= text.trim() === '';
      yield text;
    }
  }
  const rest = lineEndings.push(decoding.finish(), true);
  isEmpty &&= rest.trim() === '';
  if (isEmpty) throw new CatalogueFault('empty', 'The file is empty.');
  if (rest !== '') yield rest;
}
