import { formatQuantity, type MeasureKind } from "@/lib/format/formatQuantity";
import type { FieldKey } from "./fields";
import type { Question } from "./question";

/** What stands in for a field that was left empty, with its unit; nothing for a field that may not be empty or cannot be worked out. */
export function takenWhenEmpty(key: FieldKey, q: Question): string | undefined {
  const said = (value: number, kind: MeasureKind) => (Number.isFinite(value) ? formatQuantity(value, kind, q.choices.u) : undefined);
  switch (key) {
    case "v": return said(q.vOpening, "length");
    case "r": return said(q.insideRadius, "length");
    case "rm": return said(q.tensile, "stress");
    case "re": return said(q.material.yield, "stress");
    case "fb": return said(q.factors.bottoming, "ratio");
    case "fc": return said(q.factors.coining, "ratio");
    default: return undefined;
  }
}
