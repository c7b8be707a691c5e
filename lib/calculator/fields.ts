import type { QuantityKind } from "@/lib/format/quantityKind";

export interface CalculatorField {
  readonly label: string;
  readonly kind: QuantityKind;
  /** What stands there at first; "" where an empty field has a meaning of its own. */
  readonly start: string;
  /** May stay empty; what is taken then. */
  readonly empty?: string;
  readonly over?: number;
  readonly least?: number;
  readonly most: number;
}

/** Sizes past these are typing mistakes: 100 mm of sheet, 20 m of length. */
const SHEET = 100;
const REACH = 20_000;

/** Every input of the calculator by its name in the page's address. Bounds are in mm, degrees, MPa, kg/m³. */
export const calculatorFields = {
  t: { label: "Thickness", kind: "length", start: "2 mm", over: 0, most: SHEET },
  a: { label: "Bend angle, turned through", kind: "angle", start: "90", over: 0, most: 180 },
  v: { label: "V opening", kind: "length", start: "", empty: "usual V for the thickness", over: 0, most: 1000 },
  r: { label: "Inside radius", kind: "length", start: "", empty: "natural radius over the V", least: 0, most: 1000 },
  l: { label: "Length of the bend", kind: "length", start: "1 m", over: 0, most: REACH },
  rm: { label: "Tensile strength", kind: "stress", start: "", empty: "the material's highest", over: 0, most: 5000 },
  re: { label: "Yield strength", kind: "stress", start: "", empty: "the material's", over: 0, most: 5000 },
  k: { label: "K by hand", kind: "ratio", start: "0.44", least: 0, most: 1 },
  ma: { label: "First leg, outside", kind: "length", start: "50 mm", over: 0, most: REACH },
  mb: { label: "Second leg, outside", kind: "length", start: "50 mm", over: 0, most: REACH },
  ml: { label: "Blank before bending", kind: "length", start: "96.3 mm", over: 0, most: REACH },
  legs: { label: "Outside legs, added up", kind: "length", start: "(40 + 100 + 40) mm", over: 0, most: REACH },
  n: { label: "Equal bends", kind: "count", start: "2", least: 1, most: 200 },
  fb: { label: "Bottoming, times air", kind: "ratio", start: "", empty: "the shop's factor", least: 1, most: 50 },
  fc: { label: "Coining, times air", kind: "ratio", start: "", empty: "the shop's factor", least: 1, most: 50 },
  sh: { label: "Shoulder radius of the V", kind: "length", start: "1.5 mm", least: 0, most: 100 },
  da: { label: "Die angle", kind: "angle", start: "86", over: 0, most: 175 },
  g: { label: "Gauge", kind: "count", start: "16", least: 7, most: 30 },
  q: { label: "Reduction of area, percent", kind: "ratio", start: "50", over: 0, most: 100 },
  w: { label: "Sheet width", kind: "length", start: "2 m", over: 0, most: REACH },
  d: { label: "Sheet depth", kind: "length", start: "1 m", over: 0, most: REACH },
  ho: { label: "Hands in front of the ankles", kind: "length", start: "40 cm", over: 0, most: 2000 },
  hv: { label: "Hands over the floor", kind: "length", start: "75 cm", least: 0, most: 3000 },
  ht: { label: "Lifted up or down by", kind: "length", start: "25 cm", over: 0, most: 3000 },
  ha: { label: "Body turned by", kind: "angle", start: "0", least: 0, most: 180 },
  sl: { label: "Length of the slot", kind: "length", start: "20 mm", over: 0, most: REACH },
  he: { label: "Hole's edge to the bend line", kind: "length", start: "10 mm", least: 0, most: REACH },
  hg: { label: "Gap of the hem", kind: "length", start: "0", least: 0, most: 200 },
  sr: { label: "Inside radius to be stepped", kind: "length", start: "100 mm", over: 0, most: REACH },
  sa: { label: "Angle in all", kind: "angle", start: "90", over: 0, most: 360 },
  ss: { label: "Angle of one hit", kind: "angle", start: "2", over: 0, most: 90 },
} as const satisfies Readonly<Record<string, CalculatorField>>;

export type FieldKey = keyof typeof calculatorFields;
export const fieldKeys = Object.keys(calculatorFields) as readonly FieldKey[];

/** The field with its optional facts readable whichever field it is. */
export const fieldOf = (key: FieldKey): CalculatorField => calculatorFields[key];

/** What every section reads: the sheet and the bend. */
export const commonFields = ["t", "a", "v", "r", "l", "rm"] as const satisfies readonly FieldKey[];
