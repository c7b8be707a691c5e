import type { Vec2 } from "../../geometry/vec2";
import type { ZoneCorner } from "./zoneCorner";

/** Where a border of a zone ends, whatever it ends at. */
export const cornerPoint = (corner: ZoneCorner): Vec2 => (corner.kind === "place" ? corner.place.point : corner.point);
