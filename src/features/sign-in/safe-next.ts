/** Where to go on after signing in: only into an account of this very site, never to an address made up elsewhere. */
export function safeNext(next: string | undefined): `/${string}` {
  return next !== undefined && /^\/a\/[^/\\]/.test(next) ? (next as `/${string}`) : '/';
}
