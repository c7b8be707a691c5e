/** So many at once, the rest in turn; null when too many wait. The returned function gives the turn back. */
export function createTurns(atOnce: number, waitingMost: number): () => Promise<() => void> | null {
  const waiting: (() => void)[] = [];
  let underWay = 0;
  const giveBack = () => {
    const next = waiting.shift();
    if (next) next();
    else underWay -= 1;
  };
  return () => {
    if (underWay < atOnce) {
      underWay += 1;
      return Promise.resolve(giveBack);
    }
    if (waiting.length >= waitingMost) return null;
    return new Promise((resolve) => waiting.push(() => resolve(giveBack)));
  };
}
