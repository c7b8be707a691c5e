/** The `ilike` pattern of a text anywhere; the signs that have a meaning in patterns stand for themselves. */
export const contains = (text: string): string => `%${text.replace(/[\\%_]/g, "\\$&")}%`;
