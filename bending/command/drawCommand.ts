import { mmPer } from "../core/units";
import { DRAWING_FORMATS, drawPart } from "../exchange/drawPart";
import { flatPattern } from "../part/flatPattern";
import type { PartDocument } from "../part/partDocument";
import type { PartModel } from "../part/partModel";
import { rounded } from "../plan/rounded";
import { wrongInput, type CommandOutcome } from "./outcome";
import type { Arguments } from "./readArguments";

/** `draw PART.json --out FILE.dxf|.svg|.glb [--ticks yes] [--text TEXT]`: the file's ending says what is drawn. */
export function drawCommand({ options }: Arguments, document: PartDocument, part: PartModel): CommandOutcome {
  const path = options.get("--out");
  const format = DRAWING_FORMATS.find((one) => path?.toLowerCase().endsWith(`.${one}`));
  if (path === undefined || format === undefined) return wrongInput(`--out: name the file to write, ending in ${DRAWING_FORMATS.map((one) => `.${one}`).join(", ")}`);
  const ticks = options.get("--ticks") ?? "no";
  if (ticks !== "yes" && ticks !== "no") return wrongInput(`--ticks: "${ticks}" must be yes or no`);
  const text = options.get("--text") ?? null;
  if (format !== "dxf" && (ticks === "yes" || text !== null)) return wrongInput("--ticks, --text: marks to etch are drawn in .dxf files only");
  const { content } = drawPart(part, format, document.units, { bendTicks: ticks === "yes", text });
  const { width, depth } = flatPattern(part);
  const length = (value: number) => rounded(value / mmPer(document.units));
  return {
    exitCode: 0, error: null, file: { path, content },
    json: { part: part.name, file: path, format, units: format === "glb" ? "m" : format === "svg" ? "mm" : document.units, width: length(width), depth: length(depth), bends: part.bends.length },
  };
}
