/** A remark from a data file as a sentence, micrometres with their sign. */
export function sentence(remark: string): string {
  const text = withMicroSign(remark.trim());
  if (text === '') return '';
  return `${text[0].toUpperCase()}${text.slice(1)}${/[.!?]$/.test(text) ? '' : '.'}`;
}

export const withMicroSign = (text: string): string => text.replace(/(\d ?)um\b/g, '$1µm');
