import { MM_PER_INCH, mpa, type MPa } from "../core/units";

export interface ForceForm {
  readonly id: string;
  /** As printed. */
  readonly formula: string;
  /** The form brought to F / L = (factor + perRatio t / V) Rm t² / V, in N/mm = kN/m. */
  readonly factor: number;
  readonly perRatio: number;
  /** Tensile strength that the printed constant was read with; null where the form has Rm itself. */
  readonly base: MPa | null;
  readonly operation: "v-die" | "wiping";
  readonly source: string;
  /** Seen in a text, or recalled from memory. */
  readonly seen: boolean;
}

/** 60 000 psi, the mild steel that US charts are made for. */
export const MILD_STEEL_US = mpa(413.685);

/** One short ton a foot in kN/m: 8.896443 kN over 0.3048 m. */
export const SHORT_TON_PER_FOOT = 8.896443 / 0.3048;

/** Every published form of the air-bend force that was found; over one V they lie about 20 % apart. */
export const forceForms: readonly ForceForm[] = [
  { id: "kalpakjian-low", formula: "1.2 Rm L t² / W", factor: 1.2, perRatio: 0, base: null, operation: "v-die", source: "Kalpakjian (lower end of 1.2 to 1.33), as quoted in a student paper", seen: true },
  { id: "groover", formula: "1.33 Rm w t² / D", factor: 1.33, perRatio: 0, base: null, operation: "v-die", source: "Groover; 1.33 also in general texts", seen: true },
  { id: "trade-1.42", formula: "1.42 Rm t² L / (1000 V) kN", factor: 1.42, perRatio: 0, base: null, operation: "v-die", source: "trade formula", seen: true },
  { id: "trade-650", formula: "650 t² L / V kN, L in m", factor: 650 / 450, perRatio: 0, base: mpa(450), operation: "v-die", source: "trade formula, mild steel of about 450 MPa", seen: true },
  { id: "trade-575", formula: "575 M t² / V short tons a foot, inches", factor: (575 * SHORT_TON_PER_FOOT) / MM_PER_INCH / MILD_STEEL_US, perRatio: 0, base: MILD_STEEL_US, operation: "v-die", source: "trade rule, not from a standard, for 60 ksi steel", seen: true },
  { id: "oehler", formula: "(1 + 4 t / V) Rm L t² / V", factor: 1, perRatio: 4, base: null, operation: "v-die", source: "Oehler, quoted with Lange, Umformtechnik vol. 3, 1990; 5 <= V / t <= 20, 0.5 to 10 mm, V / punch radius >= 5", seen: true },
  { id: "groover-wiping", formula: "0.33 Rm w t² / D", factor: 0.33, perRatio: 0, base: null, operation: "wiping", source: "Groover, wiping die; recalled from memory", seen: false },
];
