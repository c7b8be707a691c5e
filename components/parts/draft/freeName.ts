/** The first of `flange1`, `flange2`, ... that nobody has. */
export function freeName(taken: readonly string[], stem = "flange"): string {
  const used = new Set(taken);
  for (let i = 1; ; i += 1) if (!used.has(`${stem}${i}`)) return `${stem}${i}`;
}
