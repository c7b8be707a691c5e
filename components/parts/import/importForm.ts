import { DRAWN_GAP_MM } from "@/bending/core/tolerance";
import { MM_PER_INCH } from "@/bending/core/units";
import type { DrawingUnit } from "@/bending/exchange/dxf/import/drawingUnit";
import { guessFacts } from "@/bending/exchange/dxf/import/guessFacts";
import type { LineRole } from "@/bending/exchange/dxf/import/lineGroup";
import type { MaterialFacts } from "@/bending/handbook/material";
import { formatNumber } from "@/lib/format/formatNumber";
import type { BendDraft, PartDraft } from "../draft/partDraft";
import { startDraft } from "../draft/startDraft";
import type { DrawingFacts } from "./drawingMessages";
import type { RememberedImport } from "./rememberedImport";

/** What is chosen and typed while a drawing is imported. */
export interface ImportForm {
  readonly unit: DrawingUnit;
  /** Whether a person said so, where the file leaves doubt. */
  readonly unitSaid: boolean;
  readonly roles: Readonly<Record<string, LineRole>>;
  readonly gap: string;
  readonly singleLines: "up" | "down" | "out";
  readonly contour: number;
  /** Everything but the flat itself. */
  readonly draft: PartDraft;
  /** By the place of the bend line: what is said otherwise than the drawing says. */
  readonly bends: Readonly<Record<string, Partial<BendDraft>>>;
  /** Where the thickness comes from, until it is typed over. */
  readonly thicknessFrom: string | null;
}

const unitOf = (unit: DrawingUnit): "mm" | "in" => (unit === "in" || unit === "ft" ? "in" : "mm");

/** Proposals of the drawing and its name, then what the last import had. */
export function startImportForm(facts: DrawingFacts, fileName: string, materials: readonly MaterialFacts[], last: RememberedImport | null): ImportForm {
  const units = unitOf(facts.units.unit);
  const guess = guessFacts(fileName, facts.texts, materials.map(({ id }) => id));
  const material = [guess.material, last?.material, "S235", materials[0]?.id].find((id) => materials.some((one) => one.id === id)) ?? "";
  const inUnits = (value: number, from: "mm" | "in") => formatNumber(value * (from === units ? 1 : from === "in" ? MM_PER_INCH : 1 / MM_PER_INCH), 4);
  const lastThickness = last === null ? "" : last.units === units ? last.thickness : "";
  return {
    unit: facts.units.unit, unitSaid: facts.units.sure,
    roles: Object.fromEntries(facts.groups.map((group) => [group.key, (group.hidden ? undefined : last?.roles[group.layer]) ?? facts.roles.get(group.key) ?? "cut"])),
    gap: String(DRAWN_GAP_MM), singleLines: "out", contour: 0, bends: {},
    draft: { ...startDraft(material), name: fileName.replace(/\.[^.]*$/, "").slice(0, 200), units, shape: "flat", thickness: guess.thickness ? inUnits(guess.thickness.value, guess.thickness.unit) : lastThickness },
    thicknessFrom: guess.thickness ? `read in “${guess.thickness.from}”` : lastThickness === "" ? null : "as in the last import",
  };
}
