import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import type { CommandWorld } from "@/bending/command/outcome";
import { runCommand } from "@/bending/command/runCommand";
import { dxfText, line, rectangle } from "@/bending/exchange/dxf/fixtures/dxfText";

const layers = [{ name: "HINAUF" }, { name: "UNTEN" }];
const drawings: Record<string, string> = {
  "plate.dxf": dxfText({ layers, entities: [...rectangle(10, 10, 100, 60), line(40, 10, 40, 70, "HINAUF"), line(80, 10, 80, 70, "UNTEN"), line(10, 10, 110, 10)] }),
  "open.dxf": dxfText({ entities: rectangle(0, 0, 100, 60).slice(1) }),
  "cut.dxf": dxfText({ entities: rectangle(0, 0, 100, 60) }).slice(0, -20),
  "narrow.dxf": dxfText({ layers: [{ name: "bend" }], entities: [...rectangle(0, 0, 100, 60), line(1, 0, 1, 60, "bend")] }),
};
const written = new Map<string, string | Uint8Array>();
const text = (path: string) => drawings[path] ?? written.get(path);
const world: CommandWorld = {
  now: () => 0,
  readBytes: (path) => { const found = text(path); return found === undefined ? { ok: false, error: "there is no such file" } : { ok: true, value: typeof found === "string" ? new TextEncoder().encode(found) : found }; },
  readText: (path) => {
    const found = text(path);
    return typeof found === "string" ? { ok: true, value: found } : { ok: true, value: readFileSync(new URL(`plans/${path}`, import.meta.url), "utf8") };
  },
};

function run(...args: string[]) {
  const outcome = runCommand(args, world);
  if (outcome.file) written.set(outcome.file.path, outcome.file.content);
  return outcome;
}

describe("drawings on the command line", () => {
  it("imports a drawing, says what was mended, and the part can be used at once", () => {
    const { exitCode, error, json } = run("import", "plate.dxf", "--thickness", "2", "--bend-layers=up=HINAUF,down=UNTEN", "--out", "plate.json");
    expect([exitCode, error]).toEqual([0, null]);
    expect(json).toMatchObject({
      units: { taken: "mm", header: "mm", sure: true }, contour: { area: 6000, holes: 0 }, written: "plate.json",
      lines: [{ layer: "0", takenAs: "cut" }, { layer: "HINAUF", takenAs: "bend up" }, { layer: "UNTEN", takenAs: "bend down" }],
      bendLines: [{ line: [[40, 10], [40, 70]], direction: "up" }, { line: [[80, 10], [80, 70]], direction: "down" }],
      repairs: [{ kind: "drawn twice", at: [60, 10] }], leftOut: [], notRead: [],
    });
    const flat = run("flat", "plate.json");
    expect(flat.json).toMatchObject({ part: "plate", width: 100, depth: 60, bends: [{ id: "b1" }, { id: "b2" }] });
  });

  it("draws a part as DXF, SVG and GLB, and reads its own DXF back", () => {
    for (const ending of ["dxf", "svg", "glb"]) {
      const { exitCode, json } = run("draw", "hat.json", "--out", `hat.${ending}`);
      expect([exitCode, (json as { bends: number }).bends]).toEqual([0, 4]);
    }
    expect(String(written.get("hat.svg"))).toContain("</svg>");
    expect(String.fromCharCode(...(written.get("hat.glb") as Uint8Array).subarray(0, 4))).toBe("glTF");
    const flat = run("flat", "hat.json").json as { readonly area: number };
    run("import", "hat.dxf", "--thickness", "2", "--out", "back.json");
    expect((run("flat", "back.json").json as { readonly area: number }).area).toBeCloseTo(flat.area, 3);
    run("draw", "hat.json", "--out", "marked.dxf", "--ticks", "yes", "--text", "P-7");
    expect(String(written.get("marked.dxf")).match(/ETCH/g)?.length).toBe(1 + 8 + 1);
  });

  it.each([
    [["import"], "FILE"],
    [["import", "nowhere.dxf", "--thickness", "2"], "nowhere.dxf: there is no such file"],
    [["import", "plate.txt", "--thickness", "2"], "plate.txt: a drawing ending in .dxf"],
    [["import", "plate.dxf"], "--thickness: give"],
    [["import", "plate.dxf", "--thickness", "thin"], '--thickness: "thin"'],
    [["import", "plate.dxf", "--thickness", "2", "--units", "yd"], '--units: "yd"'],
    [["import", "plate.dxf", "--thickness", "2", "--bend-layers", "side=X"], '--bend-layers: "side=X"'],
    [["import", "plate.dxf", "--thickness", "2", "--bend-layers", "up=NONE"], 'no lines on a layer "NONE"'],
    [["import", "plate.dxf", "--thickness", "2", "--single-lines", "left"], "--single-lines"],
    [["import", "plate.dxf", "--thickness", "2", "--material", "oak"], "material"],
    [["import", "open.dxf", "--thickness", "2"], "no closed contour was found: LINE on line"],
    [["import", "cut.dxf", "--thickness", "2"], "cut.dxf: "],
    [["import", "narrow.dxf", "--thickness", "2"], "flat.bends[0].line"],
    [["draw", "hat.json"], "--out: name the file"],
    [["draw", "hat.json", "--out", "hat.pdf"], ".dxf, .svg, .glb"],
    [["draw", "hat.json", "--out", "hat.svg", "--text", "P"], ".dxf files only"],
    [["draw", "hat.json", "--out", "hat.dxf", "--ticks", "few"], "--ticks"],
  ])("%j leaves with 2 and one line that names it", (args, says) => {
    const { exitCode, error, file } = runCommand(args, world);
    expect([exitCode, file]).toEqual([2, undefined]);
    expect(error).toContain(says);
    expect(error).not.toContain("\n");
  });
});
