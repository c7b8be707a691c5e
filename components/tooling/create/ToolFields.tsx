"use client";
import type { FieldProblem } from "@/bending/core/problem";
import { Button } from "@/components/ui/Button";
import { Choice } from "@/components/ui/Choice";
import { NumberInput } from "@/components/ui/NumberInput";
import { Panel } from "@/components/ui/Panel";
import { TextArea } from "@/components/ui/TextArea";
import { TextInput } from "@/components/ui/TextInput";
import { asSentence } from "@/lib/format/asSentence";
import { drawnProfile } from "./drawnProfile";
import type { ToolDraft } from "./toolDraft";

interface ToolFieldsProps {
  readonly draft: ToolDraft;
  readonly update: (change: Partial<ToolDraft>) => void;
  readonly problems: readonly FieldProblem[];
}

export function ToolFields({ draft, update, problems }: ToolFieldsProps) {
  const at = (path: string) => { const found = problems.find((problem) => problem.path === path || problem.path.startsWith(`${path}[`)); return found === undefined ? undefined : asSentence(found.message); };
  const punch = draft.kind === "punch";
  const draw = (relieved: boolean) => { const profile = drawnProfile(draft, relieved); if (profile !== null) update({ profile }); };
  return (
    <div className="space-y-8">
      <Panel title="Tool">
        <div className="grid grid-cols-2 gap-4">
          <div className="col-span-2"><Choice label="Kind" value={draft.kind} onChange={(kind) => update({ kind, tang: kind === "die" ? "60 mm" : "20 mm", height: kind === "die" ? "60" : "120", radius: kind === "die" ? "2" : "0.8", bodyWidth: kind === "die" ? "40" : "26", profile: "" })}
            options={[{ value: "punch", label: "Punch" }, { value: "die", label: "Die" }]} /></div>
          <TextInput id="tool-code" label="Code" value={draft.code} onChange={(event) => update({ code: event.target.value })} error={at("code")} hint="What is stamped on it" />
          <TextInput id="tool-name" label="Name" value={draft.name} onChange={(event) => update({ name: event.target.value })} error={at("name")} />
          <NumberInput id={punch ? "tool-tipAngle" : "tool-vAngle"} label={punch ? "Tip angle" : "V angle"} unit="°" value={draft.angle} onChange={(event) => update({ angle: event.target.value })} error={at(punch ? "tipAngle" : "vAngle")} />
          <NumberInput id={punch ? "tool-tipRadius" : "tool-shoulderRadius"} label={punch ? "Tip radius" : "Shoulder radius"} unit="mm" value={draft.radius} onChange={(event) => update({ radius: event.target.value })} error={at(punch ? "tipRadius" : "shoulderRadius")} />
          {punch ? null : <NumberInput id="tool-vOpening" label="V opening" unit="mm" value={draft.vOpening} onChange={(event) => update({ vOpening: event.target.value })} error={at("vOpening")} />}
          <NumberInput id="tool-height" label="Working height" unit="mm" value={draft.height} onChange={(event) => update({ height: event.target.value })} error={at("height")} />
          <NumberInput id="tool-maxForcePerMetre" label="Rating" unit="kN/m" value={draft.rating} onChange={(event) => update({ rating: event.target.value })} error={at("maxForcePerMetre")} />
          <TextInput id="tool-tang" label="Tang" value={draft.tang} onChange={(event) => update({ tang: event.target.value })} error={at("tang")} hint="Must be what the brake holds" />
        </div>
      </Panel>
      {punch ? null : (
        <Panel title="Hems">
          <Choice label="Flattens hems" value={draft.flattens ? "slot" : "none"} onChange={(value) => update({ flattens: value === "slot" })}
            options={[{ value: "none", label: "No" }, { value: "slot", label: "In a slot in its front" }]} />
          {draft.flattens ? (
            <div className="mt-4 grid grid-cols-3 gap-4">
              <NumberInput id="tool-flattening.floor" label="Floor under the top" unit="mm" value={draft.slotFloor} onChange={(event) => update({ slotFloor: event.target.value })} error={at("flattening.floor")} />
              <NumberInput id="tool-flattening.back" label="End behind the V’s middle" unit="mm" value={draft.slotBack} onChange={(event) => update({ slotBack: event.target.value })} error={at("flattening.back")} />
              <NumberInput id="tool-flattening.opening" label="Opens" unit="mm" value={draft.slotOpening} onChange={(event) => update({ slotOpening: event.target.value })} error={at("flattening.opening")} />
            </div>
          ) : null}
        </Panel>
      )}
      <Panel title="Cross-section" aside={punch ? "tip at 0 0, body above, back to the right" : "middle of the V’s top at 0 0, body below"}>
        <div className="mb-3 flex flex-wrap items-end gap-3">
          <NumberInput id="tool-bodyWidth" label="Body width" unit="mm" className="w-32" value={draft.bodyWidth} onChange={(event) => update({ bodyWidth: event.target.value })} />
          <Button look="plain" onClick={() => draw(false)}>{punch ? "Draw a straight punch" : draft.flattens ? "Draw a V die over a slot" : "Draw a V die"}</Button>
          {punch ? <Button look="plain" onClick={() => draw(true)}>Draw a relieved punch</Button> : null}
        </div>
        <TextArea id="tool-profile" label="Corners: x and y, one corner a line" rows={14} numbers spellCheck={false} value={draft.profile} onChange={(event) => update({ profile: event.target.value })} error={at("profile")} />
      </Panel>
    </div>
  );
}
