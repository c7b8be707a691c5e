"use client";
import { useSearchParams } from "next/navigation";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { useInstruments } from "@/lib/queries/bendTable";
import { useMaterials } from "@/lib/queries/materials";
import { TrialNotebook } from "./TrialNotebook";

export interface Keeper { readonly id: string; readonly name: string }

const wantable = ["material", "nominal", "vOpening"] as const;

/** Trials typed as into a shop notebook; the address may say what the first line begins with. */
export function TrialEntry({ person }: { readonly person: Keeper }) {
  const params = useSearchParams();
  const materials = useMaterials();
  const instruments = useInstruments();
  const wanted = Object.fromEntries(wantable.flatMap((field) => { const text = params.get(field); return text === null ? [] : [[field, text.slice(0, 60)]]; }));
  if (materials.isPending || instruments.isPending) return <Loading what="the notebook" />;
  if (materials.isError) return <LoadProblem what="The materials" error={materials.error} onRetry={() => void materials.refetch()} />;
  if (instruments.isError) return <LoadProblem what="The instruments" error={instruments.error} onRetry={() => void instruments.refetch()} />;
  return <TrialNotebook person={person} wanted={wanted} materials={materials.data} instruments={instruments.data} />;
}
