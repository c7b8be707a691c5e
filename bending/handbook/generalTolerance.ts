/** Fine, medium, coarse, very coarse (ISO 2768-1). */
export type ToleranceClass = "f" | "m" | "c" | "v";

export interface GeneralTolerance<Value> {
  /** Plus and minus. */
  readonly deviation: Value;
  readonly source: string;
  /** Seen in a text (second-hand copies), or recalled from memory. */
  readonly seen: boolean;
}
