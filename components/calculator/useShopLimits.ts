"use client";
import { useQuery } from "@tanstack/react-query";
import { machinesOptions } from "@/lib/queries/machines";
import { toolListOptions } from "@/lib/queries/tools";
import type { ToolListItem } from "@/lib/schemas/views";
import type { MachineView } from "@/lib/schemas/views";

/** What the reader's role may see of the shop. */
export interface ShopReads {
  readonly materials: boolean;
  readonly machines: boolean;
  readonly tools: boolean;
  readonly shopTable: boolean;
}

export interface ShopLimits {
  readonly machines: readonly MachineView[];
  readonly punches: readonly ToolListItem[];
  readonly dies: readonly ToolListItem[];
  /** More tools than one answer holds. */
  readonly more: number;
}

/** The brakes' forces and the tools' ratings; empty where the role may not read them, or while they are fetched. */
export function useShopLimits(reads: ShopReads): ShopLimits {
  const machines = useQuery({ ...machinesOptions(), enabled: reads.machines });
  const tools = useQuery({ ...toolListOptions({ pageSize: 100, sort: "maxForce", dir: "asc" }), enabled: reads.tools });
  const items = tools.data?.items ?? [];
  return {
    machines: machines.data ?? [], punches: items.filter(({ kind }) => kind === "punch"), dies: items.filter(({ kind }) => kind === "die"),
    more: (tools.data?.total ?? 0) - items.length,
  };
}
