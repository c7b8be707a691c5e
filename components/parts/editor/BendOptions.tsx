"use client";
import { Select } from "@/components/ui/Select";
import { TextInput } from "@/components/ui/TextInput";
import type { BendDraft } from "../draft/partDraft";
import { useEditor } from "./editorContext";
import { fieldId } from "./fieldId";
import { PathField } from "./PathField";

const hems: readonly { readonly value: BendDraft["hem"]; readonly label: string }[] = [
  { value: "none", label: "no hem" }, { value: "closed", label: "closed hem" }, { value: "open", label: "open hem" }, { value: "teardrop", label: "teardrop hem" },
];

interface BendOptionsProps {
  /** Path of the bend or flange in the document. */
  readonly at: string;
  readonly bend: BendDraft;
  readonly onChange: (change: Partial<BendDraft>) => void;
}

/** What one bend may say for itself, apart from the whole part. */
export function BendOptions({ at, bend, onChange }: BendOptionsProps) {
  const { problemAt } = useEditor();
  const setHem = (value: string) => {
    const hem = hems.find((one) => one.value === value)?.value ?? "none";
    onChange(hem === "none" ? { hem } : { hem, angle: "180" });
  };
  return (
    <div className="mt-2 grid grid-cols-2 gap-3 border-l-2 border-rule-strong pl-4 sm:grid-cols-3">
      <PathField path={`${at}.insideRadius`} label="Inside radius" value={bend.insideRadius} onChange={(insideRadius) => onChange({ insideRadius })} placeholder="as the part" />
      <PathField path={`${at}.kFactor`} label="K-factor" kind="number" value={bend.kFactor} onChange={(kFactor) => onChange({ kFactor })} placeholder="as the part" />
      <PathField path={`${at}.toleranceAngle`} label="Angle tolerance ±" kind="angle" value={bend.toleranceAngle} onChange={(toleranceAngle) => onChange({ toleranceAngle })} placeholder="as the part" />
      <TextInput id={fieldId(`${at}.strokeWith`)} label="Formed in one stroke with" value={bend.strokeWith} onChange={(event) => onChange({ strokeWith: event.target.value })} error={problemAt(`${at}.strokeWith`)} placeholder="no other bend" />
      <Select id={fieldId(`${at}.hem`)} label="Hem" value={bend.hem} options={hems} onChange={setHem} error={problemAt(`${at}.hem`)} />
      {bend.hem === "none" || bend.hem === "closed" ? null : <PathField path={`${at}.gap`} label="Gap inside the hem" value={bend.gap} onChange={(gap) => onChange({ gap })} />}
    </div>
  );
}
