/** When and by whom a sheet was released, in UTC so that every copy says the same; null while it is a draft. */
export function releasedText({ releasedAt, releasedBy }: { readonly releasedAt: string | null; readonly releasedBy: string | null }): string | null {
  if (releasedAt === null) return null;
  return `${releasedAt.slice(0, 10)} ${releasedAt.slice(11, 16)} UTC, ${releasedBy ?? "somebody who has left"}`;
}
