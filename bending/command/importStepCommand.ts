import { toDeg, rad } from "../core/units";
import { checkFolded } from "../exchange/step/checkFolded";
import type { RecognisedPart } from "../exchange/step/recognisedPart";
import { importedDocument } from "../exchange/step/importedDocument";
import { findingsOf } from "../findings/findingsOf";
import { builtInMaterials, materialById } from "../handbook/materials";
import { buildPart } from "../part/buildPart";
import { readPartDocument } from "../part/readPartDocument";
import { rounded } from "../plan/rounded";
import { wrongInput, type CommandOutcome, type CommandWorld } from "./outcome";
import type { Arguments } from "./readArguments";
import { problemLine } from "./readJsonFile";

const USUAL_MATERIAL = "S235";
/** What only a drawing needs to be told. */
const FOR_DRAWINGS = ["--radius", "--units", "--bend-layers", "--single-lines", "--gap", "--thickness"];

/** `import FILE.stp [--material M] [--name N] [--body B] [--out PART.json]`: the part document, and what was recognised and left out, as JSON. */
export function importStepCommand({ file, options }: Arguments, world: CommandWorld): CommandOutcome {
  const foreign = FOR_DRAWINGS.find((name) => options.has(name));
  if (foreign !== undefined) return wrongInput(`${foreign}: belongs to a drawing; a solid says this itself`);
  const body = options.get("--body");
  if (body !== undefined && !/^[1-9]\d{0,4}$/.test(body)) return wrongInput(`--body: "${body}" is not the number of a body, from 1`);
  const solid = world.readSolid?.(file);
  if (!solid) return wrongInput(`${file}: there is no geometry kernel here to read a solid with`);
  if (!solid.ok) return wrongInput(`${file}: ${solid.error}`);
  const found = solid.value;
  const document = readPartDocument(importedDocument(found, {
    name: options.get("--name") ?? file.replace(/^.*[\\/]/, "").replace(/\.[^.]*$/, ""), material: options.get("--material") ?? USUAL_MATERIAL,
  }, { materials: materialById }));
  const built = document.ok ? buildPart(document.value, { materials: materialById, knownMaterials: builtInMaterials.map(({ id }) => id) }) : document;
  const report = reportOf(file, found);
  if (!document.ok || !built.ok) {
    const problems = built.ok ? [] : built.error;
    return { exitCode: 2, error: problemLine(file, problems), json: { ...report, problems } };
  }
  const findings = findingsOf({ part: built.value, document: document.value, shop: null }).list.map(({ rule, severity, message, source }) => ({ rule, severity, message, source }));
  const path = options.get("--out");
  return {
    exitCode: 0, error: null,
    json: { ...report, foldsBackWithinMm: rounded(checkFolded(built.value, found).farthest), ...(path === undefined ? { part: document.value } : { written: path }), findings },
    ...(path === undefined ? {} : { file: { path, content: `${JSON.stringify(document.value, null, 2)}\n` } }),
  };
}

/** Faces are numbered from 1, as everywhere where a person reads them. */
function reportOf(file: string, { thickness, bends, leftOut, notes, volume, solidVolume }: RecognisedPart) {
  return {
    file, thickness: rounded(thickness),
    bends: bends.map(({ angle, direction, insideRadius, length, faces }) => ({ angle: rounded(toDeg(rad(angle))), direction, insideRadius: rounded(insideRadius), length: rounded(length), faces: faces.map((face) => face + 1) })),
    understood: rounded(volume / solidVolume),
    leftOut: leftOut.map(({ faces, message }) => ({ faces: faces.map((face) => face + 1), message })),
    notes,
  };
}
