const signatures: readonly { bytes: readonly number[]; what: string; advice: string }[] = [
  { bytes: [0x89, 0x50, 0x4e, 0x47], what: 'a PNG image', advice: 'Upload the table itself, as CSV.' },
  { bytes: [0xff, 0xd8, 0xff], what: 'a JPEG image', advice: 'Upload the table itself, as CSV.' },
  { bytes: [0x25, 0x50, 0x44, 0x46], what: 'a PDF document', advice: 'Upload the table itself, as CSV.' },
  {
    bytes: [0x50, 0x4b, 0x03, 0x04],
    what: 'a zip archive or a spreadsheet (xlsx, ods)',
    advice: 'Save the sheet as CSV (UTF-8), or unpack the archive first.',
  },
  { bytes: [0xd0, 0xcf, 0x11, 0xe0], what: 'an old spreadsheet (xls)', advice: 'Save the sheet as CSV (UTF-8).' },
  { bytes: [0x1f, 0x8b], what: 'a gzip archive', advice: 'Unpack it first.' },
  {
    bytes: [0x53, 0x49, 0x4d, 0x50, 0x4c, 0x45, 0x20, 0x20, 0x3d],
    what: 'a FITS file',
    advice: 'Export the table as CSV.',
  },
];

export const signatureLength = 16;

/** A sentence on what the file is when its first bytes say that it is no text, or null. */
export function binaryKind(start: Uint8Array): string | null {
  const found = signatures.find(({ bytes }) => bytes.every((byte, index) => start[index] === byte));
  return found ? `This is ${found.what}, not a CSV file. ${found.advice}` : null;
}
