import type { DxfTag } from "./createTagReader";

/** An entity's groups as they stand in the file. */
export interface RawEntity {
  readonly kind: string;
  readonly line: number;
  readonly tags: readonly DxfTag[];
}
