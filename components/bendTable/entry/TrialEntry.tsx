"use client";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { useInstruments } from "@/lib/queries/bendTable";
import { useMaterials } from "@/lib/queries/materials";
import { TrialNotebook } from "./TrialNotebook";

export interface Keeper { readonly id: string; readonly name: string }

/** Trials typed as into a shop notebook. */
export function TrialEntry({ person }: { readonly person: Keeper }) {
  const materials = useMaterials();
  const instruments = useInstruments();
  if (materials.isPending || instruments.isPending) return <Loading what="the notebook" />;
  if (materials.isError) return <LoadProblem what="The materials" error={materials.error} onRetry={() => void materials.refetch()} />;
  if (instruments.isError) return <LoadProblem what="The instruments" error={instruments.error} onRetry={() => void instruments.refetch()} />;
  return <TrialNotebook person={person} materials={materials.data} instruments={instruments.data} />;
}
