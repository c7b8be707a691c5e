/** Whether a file's name says that it holds a solid (ISO 10303-21). */
export const isSolidFile = (path: string): boolean => /\.(stp|step|p21)$/i.test(path);
