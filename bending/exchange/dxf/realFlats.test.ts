import { existsSync, readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { materialById } from "../../handbook/materials";
import { findingsOf } from "../../findings/findingsOf";
import { buildPart } from "../../part/buildPart";
import { flatPattern } from "../../part/flatPattern";
import { readPartDocument } from "../../part/readPartDocument";
import { flatDrawing } from "../flatDrawing";
import { importDxf } from "./import/importDxf";
import { decodeDxf } from "./read/decodeDxf";
import { writeDxf } from "./write/writeDxf";

/** Flats of real parts, kept beside the project and not in it; licence and origin stand in the README there. */
const folder = new URL("../../../../shared/data/dxf/", import.meta.url);
const there = existsSync(folder);

/** Counted and measured in the files themselves: closed loops, bend lines, the outermost lines. Radii small enough for the reliefs that the makers cut. */
const flats = [
  { file: "Central Cover.dxf", thickness: 1, insideRadius: 0.5, bends: 5, holes: 45, circles: 32, width: 511.759, depth: 437.259, header: "mm", sure: true, holesNear: false },
  { file: "Dimmer Support.dxf", thickness: 3, insideRadius: 2, bends: 2, holes: 6, circles: 6, width: 111.7351, depth: 59.5, header: "mm", sure: true, holesNear: true },
  { file: "Manometer Support.dxf", thickness: 1, insideRadius: 1, bends: 4, holes: 2, circles: 2, width: 115.788, depth: 131.599, header: "in", sure: false, holesNear: false },
] as const;

describe("flats of real parts", () => {
  if (!there) test("the folder with the real files is not here; nothing was compared", () => expect(there).toBe(false));
  for (const { file, thickness, insideRadius, bends, holes, circles, width, depth, header, sure, holesNear } of there ? flats : []) {
    test(file, () => {
      const text = decodeDxf(readFileSync(new URL(encodeURIComponent(file), folder)));
      const read = importDxf(text.ok ? text.value : "", { name: file, material: "1.4301", thickness, insideRadius });
      if (!read.ok) throw new Error(read.error);
      const { found, opened, unit, document } = read.value;
      expect([unit, opened.units.header, opened.units.sure]).toEqual(["mm", header, sure]);
      expect([found.bends.length, found.holes.length, found.holes.filter(({ circle }) => circle).length]).toEqual([bends, holes, circles]);
      expect([found.leftovers, found.repairs, opened.notes]).toEqual([[], [], []]);
      const checked = readPartDocument(document);
      const part = checked.ok ? buildPart(checked.value, { materials: materialById }) : checked;
      if (!part.ok) throw new Error(JSON.stringify(part.error));
      const findings = checked.ok ? findingsOf({ part: part.value, document: checked.value, shop: null }).list : [];
      // Its hinge holes stand over the die's opening; the makers tell that such holes puckered.
      expect(findings.some(({ rule }) => rule === "hole")).toBe(holesNear);
      const flat = flatPattern(part.value);
      // Arcs stand as chords in the outline.
      expect(flat.width).toBeCloseTo(width, 1);
      expect(flat.depth).toBeCloseTo(depth, 1);
      expect(part.value.faces).toHaveLength(bends + 1);
      const again = importDxf(writeDxf(flatDrawing(part.value), "mm"), { name: file, material: "1.4301", thickness });
      expect(again.ok && again.value.found.outline?.area).toBeCloseTo(found.outline?.area ?? NaN, 3);
      expect(again.ok && again.value.found.holes.length).toBe(holes);
    });
  }
});
