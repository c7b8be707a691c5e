"use client";
import { useRouter } from "next/navigation";
import { Button } from "@/components/ui/Button";
import { DialogBox } from "@/components/ui/DialogBox";
import { Notice } from "@/components/ui/Notice";
import { useToast } from "@/components/ui/ToastProvider";
import { useDeletePart } from "@/lib/queries/parts";
import type { PartDetail } from "@/lib/schemas/views";

export function DeletePart({ part, onClose }: { readonly part: PartDetail; readonly onClose: () => void }) {
  const router = useRouter();
  const toast = useToast();
  const remove = useDeletePart();
  const go = () => remove.mutate(part.id, { onSuccess: () => { toast("good", "Part deleted", part.number); router.push("/parts"); } });
  return (
    <DialogBox open onOpenChange={onClose} title={`Delete ${part.number}?`} description={`${part.name} goes with all of its revisions and plans. This cannot be taken back.`}
      actions={<><Button look="plain" onClick={onClose}>Keep it</Button><Button look="danger" busy={remove.isPending} onClick={go}>Delete the part</Button></>}>
      {remove.error === null ? null : <Notice tone="wrong" title="It was not deleted" live>{remove.error.message}</Notice>}
    </DialogBox>
  );
}
