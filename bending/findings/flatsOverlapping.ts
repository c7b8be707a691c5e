import { flatOverlaps } from "../part/flatOverlaps";
import type { FindingsContext } from "./context";
import type { Finding } from "./finding";

/** Faces (each with its own bend zone) that lie over one another in the unfolded sheet; a part may be drawn so, but not cut so. */
export function flatsOverlapping({ part, fields }: FindingsContext): readonly Finding[] {
  return flatOverlaps(part).map(({ faces, regions }): Finding => {
    const ids = faces.map((face) => part.faces[face]?.id ?? "");
    const own = fields.ofBend.get(ids[1] ?? "");
    return {
      key: `flats-overlap ${ids.join(" ")}`,
      rule: "flats-overlap",
      severity: "stop",
      title: "Flats overlap",
      message: `Faces ${ids[0] ?? ""} and ${ids[1] ?? ""} lie over one another in the unfolded sheet, so they cannot be cut from one piece; shorten one, inset it or taper its sides.`,
      source: "one sheet can be cut once",
      faces: ids,
      bends: [],
      paths: own ? [own.length?.path ?? own.path] : [],
      marks: regions.map((outline) => ({ kind: "region", outline })),
      measure: null,
      cure: null,
    };
  });
}
