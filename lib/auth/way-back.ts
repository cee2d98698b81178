/**
 * Where to go after signing in: an address on this site, else home.
 * `//elsewhere`, `/\elsewhere`, other schemes and control characters are somebody else's idea.
 */
export function wayBack(wanted: string | string[] | undefined): string {
  if (typeof wanted !== 'string' || !/^\/(?![/\\])[\x21-\x7e\u00a0-\uffff]*$/.test(wanted)) return '/'
  return wanted.includes('\\') ? '/' : wanted
}
