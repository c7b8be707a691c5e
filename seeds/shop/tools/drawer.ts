/** Six drawers to a cabinet, cabinets lettered from `first`: the third drawer of the first one is A3. */
export const drawer = (first: string, index: number): string =>
  `${String.fromCharCode(first.charCodeAt(0) + Math.floor(index / 6))}${(index % 6) + 1}`;
