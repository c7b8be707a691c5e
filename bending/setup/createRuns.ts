import type { MachineSettings } from "../tooling/machine";
import type { Tool } from "../tooling/tool";
import type { Run } from "./composeRuns";
import { runsFor } from "./runsFor";

/** Runs of a tool's whole stock for a line, each worked out once. */
export type RunsOf = (tool: Tool, lineLength: number) => readonly Run[];

export function createRuns(settings: MachineSettings): RunsOf {
  const known = new Map<Tool, Map<number, readonly Run[]>>();
  const nobody: ReadonlySet<string> = new Set();
  return (tool, lineLength) => {
    const ofTool = known.get(tool) ?? new Map<number, readonly Run[]>();
    known.set(tool, ofTool);
    const runs = ofTool.get(lineLength) ?? runsFor(tool.pieces, lineLength, nobody, settings);
    ofTool.set(lineLength, runs);
    return runs;
  };
}
