import type { BendData } from "./dxfDrawing";
import type { RawEntity } from "./rawEntity";
import { readText } from "./readText";

/** The name under which bend data stands in an entity's extended data. */
export const BEND_DATA_NAME = "FOLDWRIGHT";

/** Bend data of an entity, or null when there is none or it is not whole. Order: id, direction, hem (1000), angle, radius, k (1040). */
export function readBendData(raw: RawEntity): BendData | null {
  const at = raw.tags.findIndex((tag) => tag.code === 1001 && tag.value.trim() === BEND_DATA_NAME);
  if (at < 0) return null;
  const rest = raw.tags.slice(at + 1);
  const end = rest.findIndex((tag) => tag.code === 1001);
  const own = end < 0 ? rest : rest.slice(0, end);
  const [id, direction, hem = ""] = own.filter((tag) => tag.code === 1000).map((tag) => readText(tag.value));
  const [angle = NaN, insideRadius = NaN, k = NaN] = own.filter((tag) => tag.code === 1040).map((tag) => Number(tag.value));
  const whole = angle > 0 && angle <= (hem === "teardrop" ? 270 : 180) && insideRadius >= 0 && insideRadius < 1e5 && Number.isFinite(k);
  if (!id || !whole || (direction !== "up" && direction !== "down")) return null;
  return { id: id.slice(0, 64), angle, direction, hem: hem === "closed" || hem === "open" || hem === "teardrop" ? hem : null, insideRadius, k: k > 0 && k <= 1 ? k : null };
}
