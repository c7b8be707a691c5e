import type { RecognisedPart } from "@/bending/exchange/step/recognisedPart";
import type { LoadedKernel } from "@/lib/step/loadKernel";
import { readStep } from "@/lib/step/readStep";

/** The part recognised in a STEP file; a test whose file holds none fails here. */
export function mustRead(loaded: LoadedKernel, bytes: Uint8Array): RecognisedPart {
  const read = readStep(loaded, bytes);
  if (!read.ok || read.value.kind !== "part") throw new Error(JSON.stringify(read));
  return read.value.part;
}
