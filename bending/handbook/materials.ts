import { kgPerCubicMetre, mm, mpa } from "../core/units";
import { aluminiumRadiusTable } from "./aluminiumRadiusTable";
import type { MaterialField, MaterialFacts, MaterialGroup, MinimumRadiusTable, Origin } from "./material";
import { materialRule } from "./materialRule";
import { steelRadiusTable } from "./steelRadiusTable";

interface Row {
  readonly id: string;
  readonly name: string;
  readonly designation?: string;
  readonly standard: string;
  readonly tensile: readonly [number, number];
  readonly yield: number;
  readonly straight: MaterialFacts["straightLengthGroup"];
  readonly radiusPerV?: number;
  readonly radiusPerThickness?: number;
  readonly minimumRadii?: MinimumRadiusTable | undefined;
  /** Of both strengths. */
  readonly strengths: Origin;
  readonly origins?: Partial<Record<MaterialField, Origin>>;
}

const published = (text: string): Origin => ({ kind: "published", text });
const memory = (text: string): Origin => ({ kind: "memory", text });

interface Group {
  readonly modulus: number;
  readonly density: number;
  readonly radiusPerV: number;
  readonly origins: Record<"modulus" | "naturalRadiusRatio" | "allowance", Origin>;
}

const handbookRule = memory("Machinery's Handbook, straight lengths, from memory");

const GROUPS: Record<MaterialGroup, Group> = {
  steel: { modulus: 210_000, density: 7850, radiusPerV: 1 / 6, origins: { modulus: published("EN 10025-2 and general tables"), naturalRadiusRatio: published("trade chart for mild steel, V/6"), allowance: published("DIN 6935") } },
  stainless: { modulus: 200_000, density: 7900, radiusPerV: 0.21, origins: { modulus: memory("EN 10088, from memory"), naturalRadiusRatio: memory("20 to 22 % of the V (trade magazine), from memory"), allowance: published("DIN 6935, as for steel") } },
  aluminium: { modulus: 70_000, density: 2700, radiusPerV: 0.14, origins: { modulus: published("Aluminum Design Manual, rounded"), naturalRadiusRatio: published("trade magazine, 13 to 15 % of the V for 5052-H32"), allowance: handbookRule } },
  copper: { modulus: 120_000, density: 8960, radiusPerV: 0.1, origins: { modulus: memory("115 to 130 GPa, from memory"), naturalRadiusRatio: memory("steel's, scaled by tensile strength; no source"), allowance: handbookRule } },
  brass: { modulus: 107_000, density: 8440, radiusPerV: 0.13, origins: { modulus: memory("105 to 110 GPa, from memory"), naturalRadiusRatio: memory("steel's, scaled by tensile strength; no source"), allowance: handbookRule } },
};

/** Multiples of the thickness. */
const EN_485_5052: MinimumRadiusTable = {
  as: "thickness",
  rows: ([[0.5, 0.5], [1.5, 1], [6, 1.5], [12.5, 2.5]] as const).map(([upTo, across]) => ({ upTo: mm(upTo), across, along: null })),
};

/** Sheet under 3 mm has at least 510 MPa (EN 10025-2 table 7), which is DIN 6935's strongest column; thicker sheet is kept in it too, the cautious way. */
const S355_RADII = steelRadiusTable(mpa(510)) ?? undefined;

const table7 = published("EN 10025-2 table 7, up to 16 mm");
/** Sheet under 3 mm is stronger than thicker: one material covers both, so that its highest strength never makes a force too small. */
const table7Widened = published("EN 10025-2 table 7, from the lowest over 3 mm to the highest under 3 mm");

const ROWS: readonly (readonly [MaterialGroup, readonly Row[]])[] = [
  ["steel", [
    { id: "DC01", name: "Cold-rolled steel DC01", standard: "EN 10130", tensile: [270, 410], yield: 280, straight: "medium", strengths: published("EN 10130 / EN 10139; yield is the standard's maximum") },
    { id: "DC04", name: "Cold-rolled drawing steel DC04", standard: "EN 10130", tensile: [270, 370], yield: 240, straight: "medium", strengths: published("EN 10139; yield is the standard's maximum") },
    { id: "S235", name: "Structural steel S235", designation: "S235JR", standard: "EN 10025-2", tensile: [360, 510], yield: 235, straight: "medium", strengths: table7 },
    { id: "S275", name: "Structural steel S275", designation: "S275JR", standard: "EN 10025-2", tensile: [410, 580], yield: 275, straight: "medium", strengths: table7, origins: { tensile: table7Widened } },
    { id: "S355", name: "Structural steel S355", designation: "S355JR", standard: "EN 10025-2", tensile: [470, 680], yield: 355, straight: "hard", radiusPerV: 0.17, minimumRadii: S355_RADII, strengths: table7,
      origins: { tensile: table7Widened, naturalRadiusRatio: memory("upper end of 15 to 17 % of the V (trade magazine), from memory"), minimumRadii: published("DIN 6935 (1975-10) for 510 MPa") } },
  ]],
  ["stainless", [
    { id: "1.4301", name: "Stainless steel 1.4301 (304)", designation: "X5CrNi18-10", standard: "EN 10088-2", tensile: [540, 750], yield: 230, straight: "hard", strengths: memory("EN 10088-2 cold strip, from memory") },
    { id: "1.4401", name: "Stainless steel 1.4401 (316)", designation: "X5CrNiMo17-12-2", standard: "EN 10088-2", tensile: [530, 680], yield: 240, straight: "hard", strengths: memory("EN 10088-2 cold strip, from memory") },
  ]],
  ["aluminium", [
    { id: "AW-5052-H32", name: "Aluminium 5052-H32", designation: "EN AW-5052 H32", standard: "EN 485-2", tensile: [210, 260], yield: 130, straight: "medium", minimumRadii: EN_485_5052, strengths: published("EN 485-2, second-hand"), origins: { minimumRadii: published("EN 485-2 for H22 and H32 at 90 degrees, second-hand") } },
    { id: "AW-5754-H22", name: "Aluminium 5754-H22", designation: "EN AW-5754 H22", standard: "EN 485-2", tensile: [220, 270], yield: 130, straight: "medium", strengths: memory("EN 485-2, from memory") },
    { id: "AW-5754-H111", name: "Aluminium 5754-H111", designation: "EN AW-5754 H111", standard: "EN 485-2", tensile: [190, 240], yield: 80, straight: "medium", strengths: memory("EN 485-2, from memory") },
    { id: "AW-6061-T6", name: "Aluminium 6061-T6", designation: "6061-T6", standard: "ASTM B209", tensile: [290, 310], yield: 240, straight: "medium", radiusPerThickness: 2.5, minimumRadii: aluminiumRadiusTable("6061-T6"), strengths: memory("ASTM B209 / Aluminum Association, from memory"),
      origins: { defaultRadiusPerThickness: published("Aluminum Association bend table, 1/8 in"), minimumRadii: published("Aluminum Association bend table, 6061-T6, 90 degrees") } },
  ]],
  ["copper", [
    { id: "Cu-DHP-R220", name: "Copper Cu-DHP, soft R220", designation: "Cu-DHP R220", standard: "EN 1652", tensile: [220, 260], yield: 140, straight: "soft", strengths: memory("EN 1652, from memory; yield is the standard's maximum") },
    { id: "Cu-DHP-R240", name: "Copper Cu-DHP, half hard R240", designation: "Cu-DHP R240", standard: "EN 1652", tensile: [240, 300], yield: 180, straight: "medium", strengths: memory("EN 1652, from memory") },
  ]],
  ["brass", [
    { id: "CuZn37-R300", name: "Brass CuZn37, soft R300", designation: "CuZn37 R300", standard: "EN 1652", tensile: [300, 370], yield: 180, straight: "soft", strengths: memory("EN 1652, from memory; yield is the standard's maximum") },
    { id: "CuZn37-R350", name: "Brass CuZn37, half hard R350", designation: "CuZn37 R350", standard: "EN 1652", tensile: [350, 440], yield: 170, straight: "medium", strengths: memory("EN 1652, from memory") },
  ]],
];

/** Of radii that are DIN 6935's for a steel's lowest tensile strength. */
export const DIN_6935_RADII = published("DIN 6935 (1975-10)");

/** Values of the standards named; each says whether it was seen in print or is from memory. */
export const builtInMaterials: readonly MaterialFacts[] = ROWS.flatMap(([group, rows]) => rows.map((row) => builtIn(group, row)));

function builtIn(group: MaterialGroup, row: Row): MaterialFacts {
  const common = GROUPS[group];
  const tensile = [mpa(row.tensile[0]), mpa(row.tensile[1])] as const;
  return {
    id: row.id,
    name: row.name,
    designation: row.designation ?? row.id,
    standard: row.standard,
    group,
    tensile,
    yield: mpa(row.yield),
    modulus: mpa(common.modulus),
    density: kgPerCubicMetre(common.density),
    straightLengthGroup: row.straight,
    naturalRadiusRatio: row.radiusPerV ?? common.radiusPerV,
    defaultRadiusPerThickness: row.radiusPerThickness ?? 1,
    allowance: materialRule(group),
    minimumRadii: row.minimumRadii ?? (group === "steel" ? steelRadiusTable(tensile[0]) : null),
    springbackRow: null,
    origins: {
      tensile: row.strengths,
      yield: row.strengths,
      ...common.origins,
      density: memory("general tables, from memory"),
      straightLengthGroup: handbookRule,
      defaultRadiusPerThickness: memory("one thickness, common practice, no source"),
      minimumRadii: group === "steel" ? DIN_6935_RADII : memory("none found in a text that was seen"),
      springbackRow: published("elastic recovery (Gardiner 1957)"),
      ...row.origins,
    },
  };
}

const byId = new Map(builtInMaterials.map((material) => [material.id, material]));

/** The built-in material of that short name, exactly as written in `builtInMaterials`. */
export const materialById = (id: string): MaterialFacts | undefined => byId.get(id);
