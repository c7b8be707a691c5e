import type { LineField } from "./trialDraft";

/** The id of the control of one field of one line. */
export const cellId = (line: string, field: LineField): string => `trial-${line}-${field}`;
