"use client";
import { Select } from "@/components/ui/Select";
import { useToast } from "@/components/ui/ToastProvider";
import { useMachines } from "@/lib/queries/machines";
import { useUpdatePiece } from "@/lib/queries/tools";
import type { PieceState, PieceView } from "@/lib/schemas/views";

interface StateOption { readonly value: string; readonly label: string; readonly state: PieceState; readonly machineId: string | null }

/** State of a piece; at a brake it names which. */
export function PieceStateField({ piece }: { readonly piece: PieceView }) {
  const toast = useToast();
  const machines = useMachines();
  const update = useUpdatePiece();
  const options: readonly StateOption[] = [
    { value: "in rack", label: "in rack", state: "in rack", machineId: null },
    ...(machines.data ?? []).map(({ id, name }): StateOption => ({ value: id, label: `at ${name}`, state: "at brake", machineId: id })),
    { value: "at regrind", label: "at regrind", state: "at regrind", machineId: null },
    { value: "withdrawn", label: "withdrawn", state: "withdrawn", machineId: null },
  ];
  const machine = machines.data?.find(({ name }) => name === piece.machine)?.id;
  const value = piece.state === "at brake" ? (machine ?? "") : piece.state;
  const set = (next: string) => {
    const option = options.find((one) => one.value === next);
    if (option === undefined || next === value || update.isPending) return;
    update.mutate({ id: piece.id, state: option.state, ...(option.machineId === null ? {} : { machineId: option.machineId }) }, {
      onSuccess: () => toast("good", "State saved", `${piece.code}: ${option.label}`),
      onError: (error) => toast("wrong", `The state of ${piece.code} was not saved`, error.message),
    });
  };
  return <Select id={`state-${piece.id}`} label={`State of ${piece.code}`} labelHidden value={value} onChange={set} options={options} placeholder={piece.machine ?? piece.state} />;
}
