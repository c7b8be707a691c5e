"use client";
import { Save } from "lucide-react";
import { useRouter } from "next/navigation";
import { useState, type FormEvent } from "react";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { PageHeader } from "@/components/ui/PageHeader";
import { useToast } from "@/components/ui/ToastProvider";
import { ApiProblem } from "@/lib/queries/apiProblem";
import { useCreateTool } from "@/lib/queries/tools";
import { parseAngle } from "@/lib/format/parseAngle";
import { parseLength } from "@/lib/format/parseLength";
import { ToolDrawing } from "../drawing/ToolDrawing";
import { parseProfile } from "./parseProfile";
import { readToolDraft } from "./readToolDraft";
import { firstToolDraft, type ToolDraft } from "./toolDraft";
import { ToolFields } from "./ToolFields";

/** A new punch or die: its sizes, its cross-section by corners, drawn while typed. */
export function NewTool() {
  const router = useRouter();
  const toast = useToast();
  const create = useCreateTool();
  const [draft, setDraft] = useState(firstToolDraft);
  const [tried, setTried] = useState(false);
  const read = readToolDraft(draft);
  const refused = create.error instanceof ApiProblem ? create.error.errors : [];
  const problems = [...(read.ok ? [] : read.error), ...refused].filter(({ path }) => tried || (path !== "code" && (path !== "profile" || draft.profile !== "")));
  const update = (change: Partial<ToolDraft>) => { if (create.isError) create.reset(); setDraft((old) => ({ ...old, ...change })); };
  const save = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    if (!read.ok) { document.getElementById(`tool-${read.error[0]?.path ?? ""}`)?.focus(); return; }
    create.mutate(read.value, { onSuccess: (tool) => { toast("good", "Tool saved", tool.code); router.push(`/tools/${encodeURIComponent(tool.code)}`); } });
  };
  return (
    <form noValidate onSubmit={save}>
      <PageHeader kicker="New tool" title={draft.code.trim() === "" ? `New ${draft.kind}` : draft.code} summary="Lengths in mm. Pieces are added once the tool is saved."
        actions={<Button type="submit" busy={create.isPending || create.isSuccess} icon={<Save aria-hidden />}>Save tool</Button>} />
      {create.error === null ? null : <div className="mb-6"><Notice tone="wrong" title="Nothing was saved; what you entered is still here" live>{create.error.message}</Notice></div>}
      <div className="grid grid-cols-1 gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,34rem)_minmax(0,1fr)]">
        <ToolFields draft={draft} update={update} problems={problems} />
        <div className="max-w-xl space-y-4"><Drawing draft={draft} good={read.ok} /></div>
      </div>
    </form>
  );
}

function Drawing({ draft, good }: { readonly draft: ToolDraft; readonly good: boolean }) {
  const profile = parseProfile(draft.profile);
  const number = (read: { readonly ok: boolean; readonly value?: number }) => (read.ok ? (read.value ?? 0) : 0);
  if (!profile.ok || profile.value.length < 3) return <p className="border border-dashed border-rule-strong p-8 text-center text-ink-soft">The cross-section is drawn here as soon as it has three corners.</p>;
  return (
    <>
      <ToolDrawing tool={{
        kind: draft.kind, profile: profile.value, heightMm: number(parseLength(draft.height, "mm")), angleDeg: number(parseAngle(draft.angle)), radiusMm: number(parseLength(draft.radius, "mm")),
        vOpeningMm: draft.kind === "die" ? number(parseLength(draft.vOpening, "mm")) : null,
      }} />
      {good ? <Notice tone="good" title="The cross-section and the sizes agree" /> : null}
    </>
  );
}
