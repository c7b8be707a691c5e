import { STEP_LIMITS } from "./stepLimits";
import type { StepProblem } from "@/lib/schemas/stepReading";

/** How much of the end is looked through for the closing line: comments may follow it. */
const TAIL = 4_096;

/**
 * What can be said of a file before the kernel sees it (ISO 10303-21: the exchange structure opens with `ISO-10303-21;` and closes with
 * `END-ISO-10303-21;`, its entities stand in `DATA` sections). Null when nothing is wrong so far.
 */
export function stepTextProblem(bytes: Uint8Array): StepProblem | null {
  if (bytes.length > STEP_LIMITS.bytes) {
    return { kind: "too-large", message: `The file has ${(bytes.length / 1e6).toFixed(1)} MB; at most ${STEP_LIMITS.bytes / 1e6} MB are read. Export the one part alone, without its assembly.` };
  }
  if (bytes.length === 0) return { kind: "not-step", message: "The file is empty." };
  const text = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength).toString("latin1");
  if (text.startsWith("PK")) return { kind: "not-step", message: "This is a packed (zip) file. Unpack it and choose the .stp or .step file inside." };
  if (!/^\uFEFF?(?:ï»¿)?\s*(?:\/\*[\s\S]{0,4000}?\*\/\s*)*ISO-10303-21\s*;/.test(text.slice(0, 8_192))) {
    return { kind: "not-step", message: "This is not a STEP file: it does not begin with \"ISO-10303-21;\". Export the part as STEP (AP203, AP214 or AP242)." };
  }
  if (!/END-ISO-10303-21\s*;/.test(text.slice(-TAIL))) {
    return { kind: "cut-off", message: "The file is cut off: its closing line \"END-ISO-10303-21;\" is missing. Export or copy it again." };
  }
  if (!/\bDATA\s*[;(]/.test(text)) return { kind: "no-solid", message: "The file holds no data section, so there is no body in it." };
  const faces = count(text, "ADVANCED_FACE");
  if (faces > STEP_LIMITS.faces) {
    return { kind: "too-many-faces", message: `The file holds ${faces} faces; at most ${STEP_LIMITS.faces} are read. Export the one part alone, without threads and engraved text.` };
  }
  return null;
}

/** The kind of model when a file yields no solid body. */
export function noSolidProblem(bytes: Uint8Array): StepProblem {
  const text = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength).toString("latin1");
  if (["SHELL_BASED_SURFACE_MODEL", "FACE_BASED_SURFACE_MODEL", "GEOMETRIC_SET", "OPEN_SHELL"].some((name) => text.includes(name))) {
    return { kind: "surface-model", message: "The file holds surfaces and no solid body. Close the surfaces to a solid of the sheet's thickness and export that." };
  }
  if (["TESSELLATED_", "TRIANGULATED_"].some((name) => text.includes(name))) {
    return { kind: "surface-model", message: "The file holds a mesh of triangles and no exact body. Export the exact solid (boundary representation)." };
  }
  return { kind: "no-solid", message: "There is no solid body in the file. Export the folded part as a solid." };
}

function count(text: string, word: string): number {
  let found = 0;
  for (let at = text.indexOf(word); at >= 0; at = text.indexOf(word, at + word.length)) found += 1;
  return found;
}
