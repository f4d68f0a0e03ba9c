import busboy from '@fastify/busboy';
import type { IncomingHttpHeaders } from 'node:http';
import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { z } from 'zod';
import { Refusal } from '@/src/errors';
import { mappingWords } from './mapping-words';
import { catalogueDefaults, invalidRowRule } from './schema';
import { spool, type Spooled } from './spool';

const limits = { fieldNameSize: 100, fieldSize: 256 * 1024, fields: 10, files: 1, headerPairs: 50 };

const json = <T extends z.ZodType>(schema: T) =>
  z
    .string()
    .transform((text, context) => {
      try {
        return JSON.parse(text) as unknown;
      } catch {
        context.addIssue({ code: 'custom', message: 'is not JSON' });
        return z.NEVER;
      }
    })
    .pipe(schema);

export const uploadFields = z.strictObject({
  name: z.string().trim().min(1, 'is needed').max(200),
  mapping: json(mappingWords).optional(),
  defaults: json(catalogueDefaults).optional(),
  onInvalidRows: invalidRowRule.default('refuse'),
});

export type SpoolRules = { directory: string; limitBytes: number };
export type UploadForm = { file: Spooled; fileName: string; fields: Record<string, string> };

/** Reads a multipart form as it arrives: the file goes to the spool, never into memory. The caller removes it. */
export async function readUploadForm(
  body: Request['body'],
  contentType: string | null,
  { directory, limitBytes }: SpoolRules,
): Promise<UploadForm> {
  if (!body || !/^multipart\/form-data\b/i.test(contentType ?? '')) {
    throw new Refusal('unsupported', 'Send the catalogue as multipart/form-data with the fields file and name.');
  }
  const fields: Record<string, string> = {};
  let received: Promise<{ file: Spooled; fileName: string }> | undefined;
  let incoming: Readable | undefined;
  const form = parser(contentType ?? '');
  form.on('field', (name, value, nameCut, valueCut) => {
    if (nameCut || valueCut) form.destroy(new Refusal('tooLarge', `The field ${name.slice(0, 50)} is too long.`));
    else if (Object.hasOwn(fields, name)) form.destroy(new Refusal('invalid', `The form gives ${name} twice.`));
    else fields[name] = value;
  });
  form.on('file', (name, stream, fileName) => {
    if (name !== 'file') return void form.destroy(new Refusal('invalid', 'The file must be in the field file.'));
    incoming = stream;
    received = spool(stream, directory, limitBytes).then((file) => ({
      file,
      fileName: (fileName || 'catalogue.csv').slice(0, 255),
    }));
    received.catch((error: Error) => form.destroy(error));
  });
  for (const limit of ['filesLimit', 'fieldsLimit', 'partsLimit'] as const) {
    form.on(limit, () =>
      form.destroy(new Refusal('invalid', 'The form has more parts than the one file and its fields.')),
    );
  }
  try {
    await pipeline(Readable.fromWeb(body as Parameters<typeof Readable.fromWeb>[0]), form);
  } catch (error) {
    incoming?.destroy(error instanceof Error ? error : undefined);
    await received?.then(
      ({ file }) => file.remove(),
      () => undefined,
    );
    throw refusalOf(error);
  }
  if (!received) throw new Refusal('invalid', 'The form has no file.', [{ pointer: '/file', detail: 'is needed' }]);
  return { ...(await received), fields };
}

function parser(contentType: string) {
  try {
    return busboy({
      headers: { 'content-type': contentType } as IncomingHttpHeaders & { 'content-type': string },
      limits,
    });
  } catch {
    throw new Refusal('unsupported', 'The form has no boundary: send multipart/form-data.');
  }
}

/** An upload that breaks off or is malformed is the sender's, everything else is ours. */
function refusalOf(error: unknown): unknown {
  if (error instanceof Refusal) return error;
  const message = error instanceof Error ? error.message : '';
  const brokenOff = /unexpected end|premature close|aborted|terminated|malformed/i.test(message);
  return brokenOff
    ? new Refusal('invalid', 'The upload broke off before it was complete. Nothing was stored; send it again.')
    : error;
}
