"use client";
import { EmptyState } from "@/components/ui/EmptyState";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { PageHeader } from "@/components/ui/PageHeader";
import { useMachines } from "@/lib/queries/machines";
import { MachineCard } from "./MachineCard";

export function MachineList() {
  const machines = useMachines();
  return (
    <>
      <PageHeader kicker="Register" title="Brakes" summary="What the planner reckons with. The maker’s plate on the machine decides." />
      {machines.isPending ? <Loading what="the brakes" /> : machines.isError ? <LoadProblem what="The brakes" error={machines.error} onRetry={() => void machines.refetch()} />
        : machines.data.length === 0 ? <EmptyState title="No brake is set up">Without one no plan can be made.</EmptyState>
          : machines.data.map((machine) => <MachineCard key={machine.id} machine={machine} />)}
    </>
  );
}
