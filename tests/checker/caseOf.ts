import { toolToDocument, type Interval, type Machine, type PartDocument, type ToolingDocument } from "@/bending";
import type { Found } from "./judgeSeed";

/** What is needed to ask a question once more, without the draws that led to it. */
export interface FixedCase {
  readonly title: string;
  readonly part: PartDocument;
  readonly tooling: ToolingDocument;
  readonly machine: Machine;
  readonly bends: readonly number[];
  readonly front: number;
  readonly formed: number;
  readonly punch: string;
  readonly die: string;
  readonly other: string;
  /** Radians. */
  readonly demandedAngle: number;
  /** Where punch, die and the other tool stand, from the middle of the stroke. */
  readonly standing: readonly Interval[];
}

export function caseOf({ seed, index, finding, scene, answers }: Found): FixedCase {
  const tools = [...new Map([scene.punch, scene.die, scene.other].map((tool) => [tool.id, tool])).values()];
  return {
    title: `${finding.question}: ${finding.say} (seed ${seed}, ${index})`,
    part: scene.document,
    tooling: { format: "tooling/1", units: "mm", tools: tools.map((tool) => ({ ...toolToDocument(tool), sections: [{ length: 100, count: 1 }] })) },
    machine: scene.machine,
    ...scene.hit,
    punch: scene.punch.id, die: scene.die.id, other: scene.other.id,
    demandedAngle: scene.demanded,
    standing: answers.standing.map(({ at }) => at),
  };
}
