"use client";
import { Select } from "@/components/ui/Select";
import type { CornerDraft, ReliefDraft } from "../draft/partDraft";
import { useEditor } from "./editorContext";
import { fieldId } from "./fieldId";
import { PathField } from "./PathField";

interface CutFieldsProps {
  /** Path of the flange in the document; empty: the whole part. */
  readonly at: string;
  readonly relief: ReliefDraft;
  readonly corner: CornerDraft;
  /** What holds when nothing is chosen here. */
  readonly otherwise: { readonly relief: string; readonly corner: string };
  readonly onChange: (change: { readonly relief?: ReliefDraft; readonly corner?: CornerDraft }) => void;
}

/** What is cut beside a bend, and how neighbouring flanges meet. */
export function CutFields({ at, relief, corner, otherwise, onChange }: CutFieldsProps) {
  const { problemAt } = useEditor();
  const path = at === "" ? "" : `${at}.`;
  const reliefs: readonly { readonly value: ReliefDraft["kind"]; readonly label: string }[] = [
    { value: "absent", label: otherwise.relief }, ...(at === "" ? [] : [{ value: "none", label: "none" } as const]),
    { value: "rectangular", label: "rectangular" }, { value: "round", label: "round" }, { value: "tear", label: "torn" },
  ];
  const corners: readonly { readonly value: CornerDraft["kind"]; readonly label: string }[] = [
    { value: "absent", label: otherwise.corner }, ...(at === "" ? [] : [{ value: "open", label: "open" } as const]), { value: "mitre", label: "mitred" },
  ];
  return (
    <>
      <Select id={fieldId(`${path}relief`)} label={at === "" ? "Relief where a bend ends" : "Relief"} value={relief.kind} options={reliefs} error={problemAt(`${path}relief`)}
        onChange={(value) => onChange({ relief: { ...relief, kind: reliefs.find((one) => one.value === value)?.value ?? "absent" } })} />
      {relief.kind === "absent" || relief.kind === "none" ? null : (
        <>
          {relief.kind === "tear" ? null : <PathField path={`${path}relief.width`} label="Relief width" value={relief.width} onChange={(width) => onChange({ relief: { ...relief, width } })} placeholder="thickness" />}
          <PathField path={`${path}relief.depth`} label="Relief depth" value={relief.depth} onChange={(depth) => onChange({ relief: { ...relief, depth } })} placeholder="past the bend" />
        </>
      )}
      <Select id={fieldId(`${path}corner`)} label="Corners" value={corner.kind} options={corners} error={problemAt(`${path}corner`)}
        onChange={(value) => onChange({ corner: { ...corner, kind: corners.find((one) => one.value === value)?.value ?? "absent" } })} />
      {corner.kind === "mitre" ? <PathField path={`${path}corner.gap`} label="Gap in the corner" value={corner.gap} onChange={(gap) => onChange({ corner: { ...corner, gap } })} /> : null}
    </>
  );
}
