import { toDeg, toRad, deg } from "../../core/units";
import type { PlanChange } from "../../plan/planChange";
import type { Change } from "../createAttempts";
import { leastAmount } from "../leastAmount";
import { newId } from "../newTool/asNew";
import { bodyWidth } from "../newTool/bodyWidth";
import { isStraight } from "../newTool/isStraight";
import { otherDie } from "../newTool/otherDie";
import { straightPunch } from "../newTool/straightPunch";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";
import { ratingNeeded } from "./ratingNeeded";

/** Degrees, tried in turn. */
const ANGLES = [86, 84, 80, 75, 60, 45, 30, 26];
const ANGLE_DEG = 1;

/** Sharper tools: the bluntest punch and die that do, then whether one of the two alone is enough. */
export function angleChanges(facts: WhyFacts): readonly PlanChange[] {
  const { attempts, kinds, punches, dies: [die] } = facts;
  const punch = punches.find(isStraight);
  if (!kinds.has("angle") || punch === undefined || die === undefined) return [];
  attempts.doing("Looking for sharper tools that would do");
  const { request } = attempts;
  const before = attempts.plans();
  const from = Math.ceil(Math.max(toDeg(punch.tipAngle), toDeg(die.vAngle)) - 1e-6);
  const sharpPunch = (angle: number) => straightPunch(punch, bodyWidth(punch), toRad(deg(angle)));
  const sharpDie = (angle: number) => otherDie(die, { vAngle: toRad(deg(angle)), width: bodyWidth(die) });
  const found = leastAmount({
    attempts, from, asItIs: true, ladder: ANGLES.filter((angle) => angle < from), resolution: ANGLE_DEG,
    change: (angle) => ({ tools: [...request.tools, sharpPunch(angle), sharpDie(angle)] }),
  });
  if (found === null) return [];
  const alone = ([[[punch], [sharpPunch(found.value)]], [[die], [sharpDie(found.value)]]] as const).flatMap(([like, tools]) => {
    const change: Change = { tools: [...request.tools, ...tools] };
    const attempt = attempts.first(change);
    return attempt.kind === "works" ? [{ like, change, plan: attempt.plan }] : [];
  });
  const ways = alone.length > 0 ? alone.map((one) => ({ ...found, ...one })) : [{ ...found, like: [punch, die] }];
  return ways.map((way) => {
    const ratings = way.like.map(({ kind }) => ratingNeeded(facts, way.plan, way.change.tools ?? [], newId(kind)));
    const rating = Math.max(...ratings.map(({ value }) => value));
    return offeredChange(attempts, before, { ...way, resolution: ANGLE_DEG }, {
      kind: "tool-angle", group: "tool", what: { tools: way.like.map(({ id }) => id) },
      amount: { name: "angle", value: way.value, unit: "deg", from }, with: ratings.slice(0, 1),
      message: `A ${way.like.map(({ kind }) => kind).join(" and a ")} of at most ${way.value}° in place of ${way.like.map(({ id }) => id).join(" and ")}, rated for at least ${rating} kN/m, would do.`,
    });
  });
}
