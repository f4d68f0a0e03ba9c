/** Columns lined up with runs of blanks become columns parted by one blank; what stands in quotes is left alone. */
export const singleSpaces = (text: string): string =>
  text
    .replace(/^[ \t]+|[ \t]+$/gm, '')
    .replace(/"(?:[^"]|"")*"|[ \t]+/g, (found) => (found.startsWith('"') ? found : ' '));
