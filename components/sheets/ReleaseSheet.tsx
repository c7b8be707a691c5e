"use client";
import { ClipboardCheck } from "lucide-react";
import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { DialogBox } from "@/components/ui/DialogBox";
import { Notice } from "@/components/ui/Notice";
import { useToast } from "@/components/ui/ToastProvider";
import { useReleaseSheet } from "@/lib/queries/sheets";
import type { SheetDetail } from "@/lib/schemas/views";

/** Releasing is asked about once more: it freezes the sheet and takes the one before off the floor. */
export function ReleaseSheet({ sheet }: { readonly sheet: SheetDetail }) {
  const [open, setOpen] = useState(false);
  const release = useReleaseSheet();
  const toast = useToast();
  const confirm = (): void => release.mutate(sheet.id, {
    onSuccess: () => {
      setOpen(false);
      toast("good", `Sheet ${sheet.number} is released`, "The floor sees it from now on.");
    },
  });
  return (
    <>
      <Button icon={<ClipboardCheck aria-hidden />} onClick={() => { release.reset(); setOpen(true); }}>Release</Button>
      <DialogBox open={open} onOpenChange={setOpen} title={`Release sheet ${sheet.number}?`}
        description={<>Part <span className="num">{sheet.partNumber}</span> revision <span className="num">{sheet.revision}</span> on {sheet.machine}.</>}
        actions={<>
          <Button look="plain" onClick={() => setOpen(false)}>Not yet</Button>
          <Button busy={release.isPending} onClick={confirm}>Release to the floor</Button>
        </>}>
        <ul className="list-disc space-y-1 pl-5">
          <li>The sheet is frozen: later changes of part or tools do not change it.</li>
          <li>A released sheet of this part on this brake is superseded and leaves the floor.</li>
          <li>It goes into the record under your name.</li>
        </ul>
        {release.error ? <div className="mt-4"><Notice tone="wrong" live title="It was not released">{release.error.message}</Notice></div> : null}
      </DialogBox>
    </>
  );
}
