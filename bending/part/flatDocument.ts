import { mmPer, toDeg, type LengthUnit } from "../core/units";
import { convexPieces } from "../geometry/convexPieces";
import { polygonCentroid } from "../geometry/polygonCentroid";
import { signedArea } from "../geometry/signedArea";
import { documentInUnits } from "./documentInUnits";
import { flatContours } from "./flatContours";
import type { DocumentHole, FlatBendEntry, PartDocument } from "./partDocument";
import type { Bend, FlatContour, PartModel } from "./partModel";

/**
 * The part as a flat with bend lines, which folds into the same part: contours with their arcs, and each bend with the
 * inside radius and the K that it has. A flat with slits without width (a bend beside unbent sheet that has no relief) comes
 * out with an outline that touches itself, which `readPartDocument` refuses.
 */
export function flatDocument(part: PartModel, units: LengthUnit): PartDocument {
  const { outline, holes } = flatContours(part);
  const document: PartDocument = {
    format: "part/1",
    name: part.name,
    units: "mm",
    material: part.material.id,
    thickness: part.thickness,
    ...(part.toleranceLength === null ? {} : { toleranceLength: part.toleranceLength }),
    flat: {
      outline: outline.vertices.map(([x, y, bulge]) => (bulge === 0 ? [x, y] : [x, y, bulge])),
      ...(holes.length > 0 ? { holes: holes.map(holeEntry) } : {}),
      bends: part.bends.map((bend) => bendEntry(bend, part)),
      base: pointWithin(part),
    },
  };
  return mmPer(units) === 1 ? document : documentInUnits(document, units);
}

function holeEntry(contour: FlatContour): DocumentHole {
  return contour.kind === "circle"
    ? { circle: contour.centre, diameter: 2 * contour.radius }
    : { polygon: contour.vertices.map(([x, y, bulge]) => (bulge === 0 ? [x, y] : [x, y, bulge])) };
}

function bendEntry(bend: Bend, part: PartModel): FlatBendEntry {
  const partner = bend.strokeWith === null ? undefined : part.bends[bend.strokeWith]?.id;
  return {
    id: bend.id,
    line: bend.line,
    angle: toDeg(bend.angle),
    direction: bend.direction,
    ...(bend.hem === null ? {} : { hem: bend.hem }),
    ...(bend.hem === "closed" ? {} : { insideRadius: bend.insideRadius }),
    ...(bend.k > 0 && bend.k <= 1 ? { kFactor: bend.k } : {}),
    ...(bend.toleranceAngle === null ? {} : { toleranceAngle: toDeg(bend.toleranceAngle) }),
    ...(partner === undefined ? {} : { strokeWith: partner }),
  };
}

/** The middle of the largest convex piece of the base. */
function pointWithin(part: PartModel): readonly [number, number] {
  const [base] = part.faces;
  const pieces = convexPieces(base?.outline ?? [], base?.holes ?? []);
  const largest = pieces.reduce((best, piece) => (signedArea(piece) > signedArea(best) ? piece : best), pieces[0] ?? []);
  return polygonCentroid(largest);
}
