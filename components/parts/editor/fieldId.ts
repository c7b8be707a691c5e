/** The id of the control that stands for a path of the document. */
export const fieldId = (path: string): string => `at-${path.replaceAll(/[[\].]+/g, "-").replace(/-$/, "")}`;
