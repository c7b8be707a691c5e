import { expect, test } from "vitest";
import { flatDrawing } from "@/bending/exchange/flatDrawing";
import { writeSvg } from "@/bending/exchange/svg/writeSvg";
import { mustBuild } from "./mustBuild";

const part = mustBuild({
  format: "part/1", name: 'Plate "A" & <B>', units: "mm", material: "S235", thickness: 2, insideRadius: 2,
  flat: {
    outline: [[0, 0], [120, 0], [120, 80, 0.41421356237], [110, 90], [0, 90]], holes: [{ circle: [90, 45], diameter: 20 }],
    bends: [{ id: "up", line: [[30, 0], [30, 90]], angle: 90, direction: "up" }, { id: "down", line: [[60, 0], [60, 90]], angle: 45, direction: "down" }],
  },
});

test("true size, arcs as arcs, a group for each kind of line, names made safe", () => {
  const svg = writeSvg(flatDrawing(part));
  expect(svg).toContain('width="122mm" height="92mm" viewBox="0 0 122 92"');
  expect(svg).toContain("<title>Plate &quot;A&quot; &amp; &lt;B&gt;</title>");
  // From [120, 80] to [110, 90], a quarter turn to the left; y runs down and a margin of 1 is round the sheet.
  expect(svg).toContain("M1 91L121 91L121 11A10 10 0 0 0 111 1L1 1Z");
  expect(svg).toContain("M101 46A10 10 0 1 0 81 46A10 10 0 1 0 101 46Z");
  expect([...svg.matchAll(/<g id="(\w+)"/g)].map(([, id]) => id)).toEqual(["CUT", "BEND_UP", "BEND_DOWN"]);
  expect(svg).toMatch(/<g id="BEND_DOWN"[^>]*>\s*<path d="M61 (91L61 1|1L61 91)"><title>down: down 45 degrees, inside radius 2 mm/);
});
