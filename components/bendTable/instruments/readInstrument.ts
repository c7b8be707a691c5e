import { fail, ok, type Result } from "@/bending/core/result";
import { parseAngle } from "@/lib/format/parseAngle";
import { parseLength } from "@/lib/format/parseLength";
import type { InstrumentInput, InstrumentKind } from "@/lib/schemas/bendTableInputs";

export interface InstrumentTexts {
  readonly name: string;
  readonly kind: InstrumentKind;
  readonly resolution: string;
  readonly uncertainty: string;
  readonly note: string;
}

/** An instrument as typed: lengths in mm unless they say otherwise, a protractor's in degrees. What is wrong is said by field. */
export function readInstrument(texts: InstrumentTexts): Result<InstrumentInput, Readonly<Partial<Record<keyof InstrumentTexts, string>>>> {
  const read = (text: string) => (texts.kind === "protractor" ? parseAngle(text) : parseLength(text, "mm"));
  const [resolution, uncertainty] = [read(texts.resolution), read(texts.uncertainty)];
  const problems = {
    ...(texts.name.trim() === "" ? { name: "Give it a name." } : texts.name.trim().length > 80 ? { name: "At most 80 characters." } : {}),
    ...(!resolution.ok ? { resolution: resolution.error } : resolution.value < 0 || resolution.value > 10 ? { resolution: "From 0 to 10." } : {}),
    ...(!uncertainty.ok ? { uncertainty: uncertainty.error } : uncertainty.value <= 0 || uncertainty.value > 10 ? { uncertainty: "More than 0, at most 10: no instrument is without error." } : {}),
    ...(texts.note.trim().length > 500 ? { note: "At most 500 characters." } : {}),
  };
  if (!resolution.ok || !uncertainty.ok || Object.keys(problems).length > 0) return fail(problems);
  return ok({ name: texts.name.trim(), kind: texts.kind, resolution: resolution.value, uncertainty: uncertainty.value, note: texts.note.trim() });
}
