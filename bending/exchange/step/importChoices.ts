import type { AllowanceRule } from "../../part/partDocument";

/** What a person decides when a recognised part becomes a document; what is left out is as it was found. */
export interface ImportChoices {
  readonly name: string;
  readonly material: string;
  readonly rule?: AllowanceRule;
  readonly kFactor?: number;
  /** mm. */
  readonly thickness?: number;
  /** By bend, in the order of `RecognisedPart.bends`: mm and degrees turned through. */
  readonly bends?: readonly { readonly insideRadius?: number; readonly angle?: number }[];
}
