/** The first colours of the index by which DXF numbers colours. */
const names = ["", "red", "yellow", "green", "cyan", "blue", "magenta", "black or white", "dark grey", "light grey"] as const;

/** "4, cyan"; numbers beyond the named ones alone. */
export const colourName = (index: number): string => (names[index] ? `${index}, ${names[index]}` : String(index));
