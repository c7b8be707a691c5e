import { kgPerCubicMetre, mpa } from "../core/units";
import type { MaterialFacts, MaterialGroup } from "./material";

interface Row {
  readonly id: string;
  readonly name: string;
  readonly standard: string;
  readonly tensile: readonly [number, number];
  readonly yield: number;
  readonly straight: MaterialFacts["straightLengthGroup"];
  readonly radiusPerV?: number;
  readonly radiusPerThickness?: number;
  readonly source: string;
}

/**
 * Natural air-bend radius as a part of the V opening: steel V/6 (trade chart for mild steel), aluminium 13-15 %
 * (trade magazine, 5052-H32), stainless 20-22 % (from memory), copper and brass scaled by tensile strength.
 */
const GROUPS: Record<MaterialGroup, { modulus: number; density: number; radiusPerV: number }> = {
  steel: { modulus: 210_000, density: 7850, radiusPerV: 1 / 6 },
  stainless: { modulus: 200_000, density: 7900, radiusPerV: 0.21 },
  aluminium: { modulus: 70_000, density: 2700, radiusPerV: 0.14 },
  copper: { modulus: 120_000, density: 8960, radiusPerV: 0.1 },
  brass: { modulus: 107_000, density: 8440, radiusPerV: 0.13 },
};

const ROWS: readonly (readonly [MaterialGroup, readonly Row[]])[] = [
  ["steel", [
    { id: "DC01", name: "Cold-rolled steel DC01", standard: "EN 10130", tensile: [270, 410], yield: 280, straight: "medium", source: "EN 10130 / EN 10139; yield is the standard's maximum" },
    { id: "DC04", name: "Cold-rolled drawing steel DC04", standard: "EN 10130", tensile: [270, 370], yield: 240, straight: "medium", source: "EN 10139; yield is the standard's maximum; from memory in part" },
    { id: "S235", name: "Structural steel S235", standard: "EN 10025-2", tensile: [360, 510], yield: 235, straight: "medium", source: "EN 10025-2 table 7, up to 16 mm" },
    { id: "S275", name: "Structural steel S275", standard: "EN 10025-2", tensile: [410, 560], yield: 275, straight: "medium", source: "EN 10025-2 table 7, up to 16 mm" },
    { id: "S355", name: "Structural steel S355", standard: "EN 10025-2", tensile: [470, 630], yield: 355, straight: "hard", radiusPerV: 0.17, source: "EN 10025-2 table 7, up to 16 mm" },
  ]],
  ["stainless", [
    { id: "1.4301", name: "Stainless steel 1.4301 (304)", standard: "EN 10088-2", tensile: [540, 750], yield: 230, straight: "hard", source: "EN 10088-2 cold strip, from memory" },
    { id: "1.4401", name: "Stainless steel 1.4401 (316)", standard: "EN 10088-2", tensile: [530, 680], yield: 240, straight: "hard", source: "EN 10088-2 cold strip, from memory" },
  ]],
  ["aluminium", [
    { id: "AW-5052-H32", name: "Aluminium 5052-H32", standard: "EN 485-2", tensile: [210, 260], yield: 130, straight: "medium", source: "EN 485-2, second-hand" },
    { id: "AW-5754-H22", name: "Aluminium 5754-H22", standard: "EN 485-2", tensile: [220, 270], yield: 130, straight: "medium", source: "EN 485-2, from memory" },
    { id: "AW-5754-H111", name: "Aluminium 5754-H111", standard: "EN 485-2", tensile: [190, 240], yield: 80, straight: "medium", source: "EN 485-2, from memory" },
    { id: "AW-6061-T6", name: "Aluminium 6061-T6", standard: "ASTM B209", tensile: [290, 310], yield: 240, straight: "medium", radiusPerThickness: 2.5, source: "ASTM B209 / Aluminum Association, from memory; radius: Aluminum Association bend table, 1/8 in" },
  ]],
  ["copper", [
    { id: "Cu-DHP-R220", name: "Copper Cu-DHP, soft R220", standard: "EN 1652", tensile: [220, 260], yield: 140, straight: "soft", source: "EN 1652, from memory; yield is the standard's maximum" },
    { id: "Cu-DHP-R240", name: "Copper Cu-DHP, half hard R240", standard: "EN 1652", tensile: [240, 300], yield: 180, straight: "medium", source: "EN 1652, from memory" },
  ]],
  ["brass", [
    { id: "CuZn37-R300", name: "Brass CuZn37, soft R300", standard: "EN 1652", tensile: [300, 370], yield: 180, straight: "soft", source: "EN 1652, from memory; yield is the standard's maximum" },
    { id: "CuZn37-R350", name: "Brass CuZn37, half hard R350", standard: "EN 1652", tensile: [350, 440], yield: 170, straight: "medium", source: "EN 1652, from memory" },
  ]],
];

/**
 * Values of the standards named (those marked from memory were not seen in print); density and elastic
 * modulus by material group, from memory. Inside radius when nothing else gives one: one thickness, common
 * practice, no source.
 */
export const builtInMaterials: readonly MaterialFacts[] = ROWS.flatMap(([group, rows]) =>
  rows.map((row): MaterialFacts => ({
    id: row.id,
    name: row.name,
    standard: row.standard,
    group,
    tensile: [mpa(row.tensile[0]), mpa(row.tensile[1])],
    yield: mpa(row.yield),
    modulus: mpa(GROUPS[group].modulus),
    density: kgPerCubicMetre(GROUPS[group].density),
    straightLengthGroup: row.straight,
    naturalRadiusRatio: row.radiusPerV ?? GROUPS[group].radiusPerV,
    defaultRadiusPerThickness: row.radiusPerThickness ?? 1,
    source: row.source,
  })),
);

const byId = new Map(builtInMaterials.map((material) => [material.id, material]));

/** The built-in material of that short name, exactly as written in `builtInMaterials`. */
export const materialById = (id: string): MaterialFacts | undefined => byId.get(id);
