/** The style that plotly.js-dist-min 4.1.2 puts into the page by itself; it changes with that version. */
const plotlyStyle = "'sha256-2GF9hCGTDj/GGFNlQA54jDdMGl2fvoeZmZjAvBSiAtM='";

const isDevelopment = process.env.NODE_ENV === 'development';

export function contentSecurityPolicy(nonce: string): string {
  const styles = isDevelopment ? "'unsafe-inline'" : `'nonce-${nonce}' ${plotlyStyle}`;
  const scripts = `'nonce-${nonce}' 'strict-dynamic'${isDevelopment ? " 'unsafe-eval'" : ''}`;
  return [
    "default-src 'self'",
    `script-src 'self' ${scripts}`,
    `style-src 'self' ${styles}`,
    "img-src 'self' data: blob:",
    "font-src 'self' data:",
    `connect-src 'self'${isDevelopment ? ' ws:' : ''}`,
    "worker-src 'self' blob:",
    "object-src 'none'",
    "base-uri 'self'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join('; ');
}
