"use client";
import { useState } from "react";
import { useToast } from "@/components/ui/ToastProvider";
import { controlClasses } from "@/components/ui/controlClasses";
import { useUpdatePiece } from "@/lib/queries/tools";
import type { PieceView } from "@/lib/schemas/views";

/** The rack place, saved when the box is left or Enter is pressed; Escape takes the old one back. */
export function PieceRack({ piece }: { readonly piece: PieceView }) {
  const toast = useToast();
  const update = useUpdatePiece();
  const [rack, setRack] = useState(piece.rack);
  const save = () => {
    const next = rack.trim();
    if (next === piece.rack || update.isPending) return;
    update.mutate({ id: piece.id, rack: next }, {
      onSuccess: () => toast("good", "Rack place saved", `${piece.code}: ${next === "" ? "none" : next}`),
      onError: (error) => toast("wrong", `The rack place of ${piece.code} was not saved`, error.message),
    });
  };
  return (
    <input aria-label={`Rack place of ${piece.code}`} value={rack} onChange={(event) => setRack(event.target.value)} onBlur={save} aria-busy={update.isPending}
      onKeyDown={(event) => { if (event.key === "Enter") save(); if (event.key === "Escape") setRack(piece.rack); }}
      className={controlClasses(update.isError, "num min-h-8 max-w-40 px-2")} />
  );
}
