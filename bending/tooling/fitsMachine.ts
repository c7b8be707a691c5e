import type { Machine } from "./machine";
import type { Tool } from "./tool";
import type { ToolMisfit } from "./toolMisfit";

/** Null when the machine holds the tool, else what it is held by and what would be right. */
export function fitsMachine(tool: Tool, machine: Machine): ToolMisfit | null {
  const wanted = tool.kind === "punch" ? machine.punchTang : machine.dieTang;
  return tool.tang === wanted ? null : { kind: "tang", tool: tool.id, has: tool.tang, wanted };
}
