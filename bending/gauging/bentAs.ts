import { mm, rad } from "../core/units";
import type { FlatPoint } from "../geometry/vec2";
import { bendDirections } from "../part/bendDirections";
import type { Bend, PartModel } from "../part/partModel";
import type { Hit } from "../clearance/hit";
import { opposedBend } from "./opposedBend";
import type { StepErrors } from "./gaugedStep";

/**
 * The part as it really comes out: every bend line where its step put it in the sheet, every bend as far over as its
 * stroke went. The bend keeps its neutral length, so its radius follows from its angle; a closed hem is pressed shut and
 * has no angle to miss. Edges and holes stay where they were cut. Only what folding asks for is moved: zones, lines, angles.
 */
export function bentAs(part: PartModel, steps: readonly Pick<Hit, "bends">[], errors: StepErrors): PartModel {
  const bends = [...part.bends];
  steps.forEach((step, s) => {
    for (const index of step.bends) {
      const bend = bends[index];
      if (bend) bends[index] = bentBend(bend, (errors.shift[s] ?? 0) * (opposedBend(part, step, index) ? -1 : 1), errors.turn[s] ?? 0);
    }
  });
  return { ...part, bends };
}

function bentBend(bend: Bend, shift: number, turn: number): Bend {
  const { outward } = bendDirections(bend);
  const at = ([x, y]: FlatPoint): FlatPoint => [x + outward[0] * shift, y + outward[1] * shift];
  const angle = rad(bend.angle + (bend.hem === "closed" ? 0 : turn));
  const [a, b, c, d] = bend.zone;
  return {
    ...bend,
    line: [at(bend.line[0]), at(bend.line[1])],
    zone: [at(a), at(b), at(c), at(d)],
    angle,
    insideRadius: mm(bend.insideRadius + bend.allowance / angle - bend.allowance / bend.angle),
  };
}
