"use client";
import { useEffect, useRef, useState } from "react";
import { Button } from "@/components/ui/Button";
import { useToast } from "@/components/ui/ToastProvider";
import { useJudgeTrial } from "@/lib/queries/bendTable";
import type { TrialView } from "@/lib/schemas/bendTableViews";
import { JudgeDialog } from "./JudgeDialog";

/** What an engineer can do with a trial: exclude it, bring it back, withdraw it. */
export function TrialActions({ trial }: { readonly trial: TrialView }) {
  const toast = useToast();
  const judge = useJudgeTrial();
  const [asking, setAsking] = useState<"excluded" | "withdrawn" | null>(null);
  const box = useRef<HTMLDivElement>(null);
  const acted = useRef(false);
  // The button that was pressed is gone with the old state: the focus goes to the one in its place.
  useEffect(() => {
    if (!acted.current) return;
    acted.current = false;
    box.current?.querySelector("button")?.focus();
  }, [trial.state]);
  if (trial.state === "withdrawn") return null;
  const bringBack = () => judge.mutate({ id: trial.id, state: "counted" }, {
    onSuccess: () => { acted.current = true; toast("good", `${trial.number} counts again`); },
    onError: (error) => toast("wrong", `${trial.number} was not brought back`, error.message),
  });
  return (
    <div ref={box} className="flex justify-end gap-1">
      {trial.state === "excluded"
        ? <Button look="plain" size="small" busy={judge.isPending} aria-label={`Bring back ${trial.number}`} onClick={bringBack}>Bring back</Button>
        : <Button look="plain" size="small" aria-label={`Exclude ${trial.number}`} onClick={() => setAsking("excluded")}>Exclude</Button>}
      <Button look="quiet" size="small" aria-label={`Withdraw ${trial.number}`} onClick={() => setAsking("withdrawn")}>Withdraw</Button>
      {asking === null ? null : <JudgeDialog trial={trial} to={asking} onDone={() => { acted.current = true; }} onClose={() => setAsking(null)} />}
    </div>
  );
}
