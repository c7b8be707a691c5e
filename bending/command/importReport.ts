import type { ImportedDxf } from "../exchange/dxf/import/importDxf";
import { rounded } from "../plan/rounded";

/** What an import decided, found, mended and left out; places in mm where they lie in the drawing. */
export function importReport(file: string, { opened, unit, roles, found }: ImportedDxf) {
  const at = (point: readonly [number, number]) => [rounded(point[0]), rounded(point[1])];
  return {
    file,
    units: { taken: unit, header: opened.units.header, sure: opened.units.sure && opened.units.unit === unit, reasons: opened.units.reasons },
    lines: opened.groups.map(({ key, layer, colour, lineType, kinds }) => ({ layer, colour, lineType, takenAs: roles.get(key) ?? "cut", kinds })),
    contour: { area: rounded(found.outline?.area ?? 0), holes: found.holes.length },
    bendLines: found.bends.map(({ line, direction }) => ({ line: line.map(at), direction })),
    singleLines: found.singleLines.map((line) => line.map(at)),
    repairs: found.repairs.map(({ kind, at: place, message }) => ({ kind, at: at(place), message })),
    leftOut: found.leftovers.map(({ what, at: place }) => ({ what, at: at(place) })),
    notRead: [...opened.notes, ...(opened.moreNotes > 0 ? [{ line: 0, message: `and ${opened.moreNotes} more` }] : [])],
  };
}
