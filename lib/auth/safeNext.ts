/** Where to go after signing in: a path of this site, never another site's address. */
export function safeNext(asked: string | null | undefined): string {
  if (!asked || !/^\/(?![/\\])/.test(asked)) return "/";
  return /[\u0000-\u001f\\]/.test(asked) ? "/" : asked;
}
