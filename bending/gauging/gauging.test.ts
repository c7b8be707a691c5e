import { describe, expect, test } from "vitest";
import { machineFrames } from "../clearance/machineFrames";
import { partOf, profilePart } from "../clearance/trial/trialParts";
import { invariant } from "../core/invariant";
import { mm, rad } from "../core/units";
import { applyFrame } from "../geometry/applyFrame";
import type { PartModel } from "../part/partModel";
import { legDimensions } from "./legDimensions";
import { levelFrames } from "./levelFrames";
import type { GaugedStep, Repeats } from "./gaugedStep";
import { partTolerances } from "./partTolerances";
import { die, punch, trialSteps } from "./trial/trialSteps";

const gaugeOnly: Repeats = { gauge: mm(0.1), angle: rad(0) };

/** The tolerances of the legs of a profile, along it. */
const legs = (part: PartModel, steps: readonly GaugedStep[], repeats: Repeats) => partTolerances(part, steps, repeats, legDimensions(part));
const worst = (part: PartModel, steps: readonly GaugedStep[]) => legs(part, steps, gaugeOnly).map(({ worstCase }) => worstCase);
const near = (sizes: readonly number[]) => sizes.map((size) => expect.closeTo(size, 6) as number);

test("before a stroke the sheet lies as the machine's own placement has it, whatever is formed, up or down, either face in front", () => {
  const part = profilePart([20, 40, 60, 40, 20], [90, -70, -90, 80]);
  part.bends.forEach((bend, index) => {
    for (const front of [bend.parent, bend.child]) {
      const hit = { bends: [index], front, formed: 0b1011 & ~(1 << index) };
      const expected = machineFrames(part, hit, rad(0), punch, die);
      levelFrames(part, hit).forEach((frame, face) => {
        const other = expected[face];
        invariant(other, "as many frames as faces");
        expect(applyFrame(frame, [30, 40, 1])).toEqual(near(applyFrame(other, [30, 40, 1])));
      });
    }
  });
});

describe("Z of 40, 60 and 30, square bends, every stop good for 0.1 mm", () => {
  const z = profilePart([40, 60, 30], [90, -90]);
  const fromEdges = trialSteps(z, [[0, 1, "edge"], [1, 1, "edge"]]);
  const fromFlange = trialSteps(z, [[0, 1, "edge"], [1, 2, "face"]]);

  test("each outer leg gauged from its own edge: the outer legs miss by one stop, the web between by two", () => {
    expect(legs(z, fromEdges, gaugeOnly).map(({ nominal }) => nominal)).toEqual(near([40, 60, 30]));
    expect(worst(z, fromEdges)).toEqual(near([0.1, 0.2, 0.1]));
    // Two rectangular errors of 0.1: 2 x sqrt(2) x 0.1 / sqrt(3).
    expect(legs(z, fromEdges, gaugeOnly)[1]?.statistical).toBeCloseTo(0.16330, 5);
  });

  test("the second bend gauged from the flange that stands: the web misses by one stop, the last leg by two", () => {
    expect(worst(z, fromFlange)).toEqual(near([0.1, 0.1, 0.2]));
  });

  test("the angle of the flange that is gauged from moves the next line by the angle times the height above the bend", () => {
    const [bend, step] = [z.bends[0], fromFlange[1]];
    invariant(bend && step?.touch, "the second step is gauged");
    const frame = levelFrames(z, step)[step.touch.face];
    invariant(frame, "the flange stands somewhere");
    const height = -applyFrame(frame, step.touch.point)[1];
    // The flange hangs behind the die: of its 40 mm the lowest that the finger reaches. It turns about the end of the arc, whose outside radius is
    // allowance / angle - k t + t and shrinks while the angle grows.
    const outer = bend.insideRadius + z.thickness;
    const lever = height + z.thickness - outer + bend.allowance / bend.angle ** 2;
    const share = legs(z, fromFlange, { gauge: mm(0), angle: rad(0.005) })[2]?.shares.find(({ step: s }) => s === 0);
    expect(height).toBeGreaterThan(10);
    expect(share?.angle).toBeCloseTo(0.005 * lever, 6);
  });

  test("a step that nothing holds bounds nothing that hangs on it, and leaves the rest alone", () => {
    const blind = fromEdges.map((step, s) => (s === 1 ? { ...step, touch: null } : step));
    expect(worst(z, blind)).toEqual([expect.closeTo(0.1, 6), null, null]);
  });
});

describe("hat of 20, 40, 60, 40 and 20", () => {
  const hat = profilePart([20, 40, 60, 40, 20], [90, -90, -90, 90]);

  test("brims first from the edges, then the top from the standing brims: the top takes all four stops", () => {
    expect(worst(hat, trialSteps(hat, [[0, 1, "edge"], [3, 3, "edge"], [1, 2, "face"], [2, 2, "face"]]))).toEqual(near([0.1, 0.1, 0.4, 0.1, 0.1]));
  });

  test("the last bend gauged over the top from its other flange: the top by one stop, the side before it by what is left", () => {
    const steps = trialSteps(hat, [[0, 1, "edge"], [3, 3, "edge"], [1, 2, "face"], [2, 3, ({ face, on }) => on === "face" && face === 1]]);
    // Line 1 lies off by two stops, line 2 by those and its own; line 3 by one: the side between 2 and 3 takes four.
    expect(worst(hat, steps)).toEqual(near([0.1, 0.1, 0.1, 0.4, 0.1]));
  });
});

test("the fold of a hem as the stop: the leg from fold to bend misses by one stop, the hem's own leg by its own", () => {
  const hemmed = partOf({
    format: "part/1", name: "Hem", units: "mm", material: "S235", thickness: 1, insideRadius: 1.5,
    profile: { width: 200, legs: [10, 80, 40], bends: [{ angle: 180, direction: "up", hem: "closed" }, { angle: 90, direction: "up" }] },
  });
  const steps = trialSteps(hemmed, [[0, 0, "edge"], [1, 2, "face"]]);
  expect(steps[1]?.touch?.fold).toBe(0);
  expect(worst(hemmed, steps)).toEqual(near([0.1, 0.1, 0.2]));
});
