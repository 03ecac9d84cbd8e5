/**
 * What a page may load: our own files, and the scripts and styles that carry this answer's nonce.
 * `development` adds what the framework's reloading needs: eval, inline styles and its socket.
 */
export function contentSecurityPolicy(nonce: string, development: boolean): string {
  const rules = {
    'default-src': "'self'",
    'script-src': `'self' 'nonce-${nonce}' 'strict-dynamic'${development ? " 'unsafe-eval'" : ''}`,
    'style-src': development ? "'self' 'unsafe-inline'" : `'self' 'nonce-${nonce}'`,
    'img-src': "'self' data: blob:",
    'font-src': "'self'",
    'connect-src': development ? "'self' ws:" : "'self'",
    'worker-src': "'self'",
    'object-src': "'none'",
    'base-uri': "'none'",
    'form-action': "'self'",
    'frame-ancestors': "'none'",
  };
  return Object.entries(rules)
    .map(([name, value]) => `${name} ${value}`)
    .join('; ');
}
