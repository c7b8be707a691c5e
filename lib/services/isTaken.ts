/** Whether this was thrown because the named unique rule forbids it (SQLSTATE 23505). */
export function isTaken(thrown: unknown, rule: string): boolean {
  return thrown instanceof Error && "code" in thrown && thrown.code === "23505" && "constraint" in thrown && thrown.constraint === rule;
}
