/** Name of a file that holds a revision of a part: `P-1004-rev2.dxf`; signs that file systems dislike become underscores. */
export const partFileName = (number: string, revision: number, ending: string): string => `${number.replace(/[^A-Za-z0-9._-]/g, "_")}-rev${revision}.${ending}`;
