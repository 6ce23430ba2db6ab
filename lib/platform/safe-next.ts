/** Where to go after signing in: only ever a path of our own. */
export function safeNext(next: string | string[] | undefined): string | null {
  if (typeof next !== "string" || !/^\/(?![/\\])/.test(next)) return null;
  return next.startsWith("/sign-") || next.startsWith("/api/") ? null : next;
}
