import type { ToolingDocument } from "@/bending/tooling/toolingDocument";
import { dies } from "./tools/dies";
import { punches } from "./tools/punches";

/** Everything that the invented shop's toolroom owns, as one tooling document. */
export const tooling: ToolingDocument = { format: "tooling/1", units: "mm", tools: [...punches, ...dies] };
