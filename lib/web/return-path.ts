/** A path of our own to go on to after signing in; anything else becomes the list of passages. */
export function returnPath(next: string | undefined): string {
  if (!next || !next.startsWith('/') || /^\/[/\\]/.test(next) || /[\s\\]/.test(next)) return '/passages';
  return new URL(next, 'http://own.invalid').origin === 'http://own.invalid' ? next : '/passages';
}
