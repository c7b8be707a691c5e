import { DRAWN_GAP_MM } from "../core/tolerance";
import { MM_PER_INCH } from "../core/units";
import { decodeDxf } from "../exchange/dxf/read/decodeDxf";
import { mmPerDrawingUnit, type DrawingUnit } from "../exchange/dxf/import/drawingUnit";
import { importDxf } from "../exchange/dxf/import/importDxf";
import type { LineRole } from "../exchange/dxf/import/lineGroup";
import { findingsOf } from "../findings/findingsOf";
import { builtInMaterials, materialById } from "../handbook/materials";
import { buildPart } from "../part/buildPart";
import { readPartDocument } from "../part/readPartDocument";
import { fail, ok, type Result } from "../core/result";
import { importReport } from "./importReport";
import { wrongInput, type CommandOutcome, type CommandWorld } from "./outcome";
import type { Arguments } from "./readArguments";
import { readNumber } from "./readNumber";
import { problemLine } from "./readJsonFile";

const USUAL_MATERIAL = "S235";

/** `import FILE.dxf --thickness T [...] [--out PART.json]`: the part document, and what was decided, mended and left out, as JSON. */
export function importCommand({ file, options }: Arguments, world: CommandWorld): CommandOutcome {
  if (!/\.dxf$/i.test(file)) return wrongInput(`${file}: a drawing ending in .dxf or a solid ending in .stp or .step was expected`);
  if (options.has("--body")) return wrongInput("--body: belongs to a solid (.stp, .step)");
  const thickness = readLength(options, "--thickness");
  if (!thickness.ok) return wrongInput(thickness.error);
  if (thickness.value === undefined) return wrongInput("--thickness: give the sheet's thickness, e.g. 1.5 or 0.06in; a drawing does not say it");
  const radius = readLength(options, "--radius");
  if (!radius.ok) return wrongInput(radius.error);
  const gap = readNumber(options, "--gap", DRAWN_GAP_MM, { least: 0, most: 5, whole: false });
  if (!gap.ok) return wrongInput(gap.error);
  const unit = options.get("--units");
  if (unit !== undefined && !Object.hasOwn(mmPerDrawingUnit, unit)) return wrongInput(`--units: "${unit}" must be one of ${Object.keys(mmPerDrawingUnit).join(", ")}`);
  const singleLines = options.get("--single-lines");
  if (singleLines !== undefined && singleLines !== "up" && singleLines !== "down") return wrongInput(`--single-lines: "${singleLines}" must be up or down`);
  const layers = readBendLayers(options.get("--bend-layers"));
  if (!layers.ok) return wrongInput(layers.error);
  const bytes = world.readBytes(file);
  if (!bytes.ok) return wrongInput(`${file}: ${bytes.error}`);
  const text = decodeDxf(bytes.value);
  if (!text.ok) return wrongInput(`${file}: ${text.error}`);
  const read = importDxf(text.value, {
    name: options.get("--name") ?? file.replace(/^.*[\\/]/, "").replace(/\.dxf$/i, ""), material: options.get("--material") ?? USUAL_MATERIAL,
    thickness: thickness.value, insideRadius: radius.value, unit: unit as DrawingUnit | undefined, layers: layers.value, gap: gap.value, singleLines: singleLines ?? null,
  });
  if (!read.ok) return wrongInput(`${file}: ${read.error}`);
  const report = importReport(file, read.value);
  const document = readPartDocument(read.value.document);
  const built = document.ok ? buildPart(document.value, { materials: materialById, knownMaterials: builtInMaterials.map(({ id }) => id) }) : document;
  if (!document.ok || !built.ok) {
    const problems = built.ok ? [] : built.error;
    return { exitCode: 2, error: problemLine(file, problems), json: { ...report, part: read.value.document, problems } };
  }
  const findings = findingsOf({ part: built.value, document: document.value, shop: null }).list.map(({ rule, severity, message, source }) => ({ rule, severity, message, source }));
  const path = options.get("--out");
  return {
    exitCode: 0, error: null, json: { ...report, ...(path === undefined ? { part: document.value } : { written: path }), findings },
    ...(path === undefined ? {} : { file: { path, content: `${JSON.stringify(document.value, null, 2)}\n` } }),
  };
}

/** A length in mm; `0.06in` is in inches. */
function readLength(options: Arguments["options"], name: string): Result<number | undefined, string> {
  const text = options.get(name);
  if (text === undefined) return ok(undefined);
  const parts = /^(\d+(?:\.\d+)?|\.\d+)\s*(mm|in)?$/.exec(text.trim());
  const value = Number(parts?.[1]) * (parts?.[2] === "in" ? MM_PER_INCH : 1);
  return parts && value > 0 ? ok(value) : fail(`${name}: "${text}" is not a length; write 1.5, 1.5mm or 0.06in`);
}

/** `up=NAME,down=NAME`, each as often as needed. */
function readBendLayers(text: string | undefined): Result<ReadonlyMap<string, LineRole> | undefined, string> {
  if (text === undefined) return ok(undefined);
  const layers = new Map<string, LineRole>();
  for (const entry of text.split(",")) {
    const parts = /^\s*(up|down)=(.+?)\s*$/.exec(entry);
    if (!parts?.[2]) return fail(`--bend-layers: "${entry}" must be up=LAYER or down=LAYER`);
    layers.set(parts[2], parts[1] === "up" ? "bend up" : "bend down");
  }
  return ok(layers);
}
