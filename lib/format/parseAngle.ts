import type { Result } from "@/bending/core/result";
import { parseNumber } from "./parseNumber";

/** An angle in degrees as people type it: `90`, `90°`, `22.5 deg`. */
export function parseAngle(text: string): Result<number, string> {
  const bare = text.replace(/\s*(°|deg|degrees?)\s*$/i, "");
  return bare.trim() === "" ? { ok: false, error: "Type an angle in degrees." } : parseNumber(bare);
}
