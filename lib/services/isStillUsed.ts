/** Whether this was thrown because something else refers to it or must stay on record (SQLSTATE 23001, 23503). */
export function isStillUsed(thrown: unknown): boolean {
  return thrown instanceof Error && "code" in thrown && (thrown.code === "23001" || thrown.code === "23503");
}
