"use client";
import { Save, Undo2 } from "lucide-react";
import { useState, type FormEvent } from "react";
import { publishedMethodFactors } from "@/bending/handbook/forceMethods";
import { Button } from "@/components/ui/Button";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { Notice } from "@/components/ui/Notice";
import { NumberInput } from "@/components/ui/NumberInput";
import { Panel } from "@/components/ui/Panel";
import { TextInput } from "@/components/ui/TextInput";
import { useToast } from "@/components/ui/ToastProvider";
import { asSentence } from "@/lib/format/asSentence";
import { parseNumber } from "@/lib/format/parseNumber";
import { ApiProblem } from "@/lib/queries/apiProblem";
import { useShopSettings, useUpdateForceSettings } from "@/lib/queries/shopSettings";
import type { ShopSettingsView, UpdateForceSettingsInput } from "@/lib/schemas/shopSettings";

const methods = ["air", "bottoming", "coining"] as const;
const words = { air: "Air bending", bottoming: "Bottoming", coining: "Coining" } as const;

/** What the air-bend force of the formula is multiplied by, for each way of bending; with what is published beside it. */
export function ForceFactors({ mayWrite }: { readonly mayWrite: boolean }) {
  const settings = useShopSettings();
  if (settings.isPending) return <Loading what="the settings" />;
  if (settings.isError) return <LoadProblem what="The settings" error={settings.error} onRetry={() => void settings.refetch()} />;
  return (
    <div className="grid grid-cols-1 gap-x-10 gap-y-8 lg:grid-cols-2">
      <Panel title="Force factors" aside={settings.data.forceIsDefault ? "defaults" : <>the shop’s own, <span className="num">{settings.data.forceChangedAt?.slice(0, 10)}</span> {settings.data.forceChangedBy}</>}>
        <FactorForm settings={settings.data} mayWrite={mayWrite} />
      </Panel>
      <Panel title="Published factors" aside="they disagree widely">
        <ul>
          {publishedMethodFactors.map(({ method, over, factor: [low, high], source, seen }) => (
            <li key={`${method} ${source}`} className="flex flex-wrap justify-between gap-x-4 border-b border-rule py-1.5">
              <span>{words[method]} <span className="num font-medium">{low === high ? low : `${low} to ${high}`}</span> times {over === "air" ? "air bending" : "bottoming"}</span>
              <span className="text-ink-soft">{source}{seen ? "" : " (not seen in print)"}</span>
            </li>
          ))}
        </ul>
      </Panel>
    </div>
  );
}

type Draft = Record<(typeof methods)[number] | "source", string>;

const draftOf = ({ forceFactors, forceSource, forceIsDefault }: ShopSettingsView): Draft => ({
  air: String(forceFactors.air), bottoming: String(forceFactors.bottoming), coining: String(forceFactors.coining), source: forceIsDefault ? "" : forceSource,
});

function FactorForm({ settings, mayWrite }: { readonly settings: ShopSettingsView; readonly mayWrite: boolean }) {
  const toast = useToast();
  const update = useUpdateForceSettings();
  const [draft, setDraft] = useState(() => draftOf(settings));
  const [tried, setTried] = useState(false);
  const numbers = methods.map((method) => ({ method, read: parseNumber(draft[method]) }));
  const wrong = (name: keyof Draft): string | undefined => {
    const refused = update.error instanceof ApiProblem ? update.error.messageAt(`forceFactors.${name}`) : undefined;
    if (refused !== undefined) return asSentence(refused);
    if (name === "source") return tried && draft.source.trim() === "" ? "Say where the factors are from." : undefined;
    const read = numbers.find(({ method }) => method === name)?.read;
    return read?.ok === false ? read.error : undefined;
  };
  const send = (forceFactors: UpdateForceSettingsInput["forceFactors"]) => update.mutate({ basedOn: settings.forceVersion, forceFactors }, {
    onSuccess: (saved) => { setDraft(draftOf(saved)); setTried(false); toast("good", forceFactors === null ? "Defaults are back" : "Factors saved"); },
  });
  const save = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    const [air, bottoming, coining] = numbers.map(({ read }) => (read.ok ? read.value : NaN));
    if (draft.source.trim() === "" || air === undefined || bottoming === undefined || coining === undefined || numbers.some(({ read }) => !read.ok)) return;
    send({ air, bottoming, coining, source: draft.source.trim() });
  };
  return (
    <form noValidate onSubmit={save} className="space-y-4">
      {update.error === null ? null : <Notice tone="wrong" title="Nothing was saved; what you entered is still here" live>{update.error.message}</Notice>}
      <p className="text-ink-soft">{settings.forceSource}.</p>
      <div className="grid grid-cols-3 gap-3">
        {methods.map((method) => <NumberInput key={method} id={`force-${method}`} label={words[method]} unit="×" value={draft[method]} disabled={!mayWrite} error={wrong(method)} onChange={(event) => setDraft((old) => ({ ...old, [method]: event.target.value }))} />)}
      </div>
      {mayWrite ? (
        <>
          <TextInput id="force-source" label="Where the factors are from" value={draft.source} maxLength={300} placeholder="Read at the brake’s gauge, 20 bends" error={wrong("source")} onChange={(event) => setDraft((old) => ({ ...old, source: event.target.value }))} />
          <div className="flex flex-wrap gap-2">
            <Button type="submit" icon={<Save aria-hidden />} busy={update.isPending}>Save factors</Button>
            {settings.forceIsDefault ? null : <Button look="plain" icon={<Undo2 aria-hidden />} busy={update.isPending} onClick={() => send(null)}>Back to the defaults</Button>}
          </div>
        </>
      ) : null}
    </form>
  );
}
