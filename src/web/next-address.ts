/** Where to go on after signing in: an address of our own, or home. */
export function nextAddress(wanted: unknown): string {
  if (typeof wanted !== 'string' || wanted.length > 500) return '/home';
  const isOurs = /^\/(?![/\\])[^\\\u0000-\u001f]*$/.test(wanted) && new URL(wanted, 'http://x').host === 'x';
  return isOurs ? wanted : '/home';
}
