import { Readable } from 'node:stream';

type Pieces = AsyncIterable<string | Uint8Array>;

/** A streamed file; the name is made harmless for the header and given in full as RFC 6266 has it. */
export function download(
  fileName: string,
  type: string,
  pieces: Pieces,
  headers: Record<string, string> = {},
): Response {
  const plain = fileName.normalize('NFKD').replace(/[^\w .()-]+/g, '_');
  const body = Readable.toWeb(Readable.from(bytesOf(pieces), { objectMode: false })) as ReadableStream<Uint8Array>;
  return new Response(body, {
    headers: {
      'content-type': type,
      'content-disposition': `attachment; filename="${plain}"; filename*=UTF-8''${encodeURIComponent(fileName)}`,
      'cache-control': 'private, no-store',
      'x-content-type-options': 'nosniff',
      ...headers,
    },
  });
}

async function* bytesOf(pieces: Pieces): AsyncGenerator<Uint8Array> {
  for await (const piece of pieces) yield typeof piece === 'string' ? Buffer.from(piece) : piece;
}

export const csvDownload = (name: string, lines: AsyncIterable<string>): Response =>
  download(`${name}.csv`, 'text/csv; charset=utf-8', lines);
