/** `?q=rail&page=2`, leaving out what is not given; "" when nothing is. */
export function queryText(query: object): string {
  const given = Object.entries(query).filter(([, value]) => value !== undefined && value !== "");
  return given.length === 0 ? "" : `?${new URLSearchParams(given.map(([name, value]) => [name, String(value)])).toString()}`;
}
