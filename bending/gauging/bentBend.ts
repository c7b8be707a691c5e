import { mm, rad } from "../core/units";
import type { FlatPoint } from "../geometry/vec2";
import { bendDirections } from "../part/bendDirections";
import type { Bend } from "../part/partModel";

/**
 * A bend as it really comes out: its line `shift` mm farther towards its child, its angle `turn` radians over. The bend keeps
 * its neutral length, so its radius follows from its angle; a closed hem is pressed shut and has no angle to miss. Only what
 * folding asks for is changed: zone, line, angle and radius.
 */
export function bentBend(bend: Bend, shift: number, turn: number): Bend {
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
