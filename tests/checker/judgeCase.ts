import { buildPart, createClearance, materialById, rad, readPartDocument, readToolingDocument, type Tool } from "@/bending";
import type { FixedCase } from "./caseOf";
import { judgeScene, type SceneResult } from "./judgeScene";
import type { Modeller } from "./modeller";
import type { Scene } from "./scene";
import { createStages } from "./stage";
import { createToolShapes } from "./toolBars";
import { createRandom } from "./random";

/** A written-down case, asked anew: every question. */
export function judgeCase(modeller: Modeller, fixed: FixedCase): SceneResult {
  const read = readPartDocument(fixed.part);
  const part = read.ok ? buildPart(read.value, { materials: materialById }) : read;
  const tools = readToolingDocument(fixed.tooling);
  if (!part.ok || !tools.ok) throw new Error(`${fixed.title}: the case cannot be read`);
  const tool = <Kind extends Tool["kind"]>(id: string, kind: Kind) => {
    const found = tools.value.find((one): one is Extract<Tool, { kind: Kind }> => one.id === id && one.kind === kind);
    if (!found) throw new Error(`${fixed.title}: there is no ${kind} ${id}`);
    return found;
  };
  const other = tools.value.find(({ id }) => id === fixed.other);
  if (!other) throw new Error(`${fixed.title}: there is no tool ${fixed.other}`);
  const { bends, front, formed, machine } = fixed;
  const [punch, die, demanded] = [tool(fixed.punch, "punch"), tool(fixed.die, "die"), rad(fixed.demandedAngle)];
  const scene: Scene = {
    document: fixed.part, part: part.value, machine, punch, die, other, demanded, hit: { bends, front, formed }, stroke: { bends, front, punch, die },
    clearance: createClearance(part.value, machine, { demandedAngle: () => demanded }),
  };
  const stage = createStages(modeller)(scene);
  if (!stage) throw new Error(`${fixed.title}: the die does not fit the bend`);
  const random = createRandom(1);
  return judgeScene({ modeller, scene, stage, random, fingerShape: createToolShapes(modeller)(machine.gauge.fingerProfile), places: fixed.standing, all: true });
}
