import { fail, ok, type Result } from "../../../core/result";
import type { DxfDrawing, DxfEntity, DxfNote } from "../read/dxfDrawing";
import { DXF_LIMITS } from "../read/dxfLimits";
import { composeAffine, identityAffine, type Affine } from "./affine";
import { moveCurve } from "./moveCurve";
import type { Curve, PlacedDrawing, PlacedShape } from "./placedShape";

interface Looks { readonly layer: string; readonly colour: number; readonly lineType: string; readonly hidden: boolean }

/** Puts blocks in (within blocks too, scaled, turned, mirrored, in rows) and settles each shape's layer, colour and line type. */
export function placeShapes(drawing: DxfDrawing): Result<PlacedDrawing, string> {
  const shapes: PlacedShape[] = [];
  const texts: string[] = [];
  const notes: DxfNote[] = [];
  // Blocks that put in nothing but empty blocks are bounded by the visits, shapes by their count.
  let visits = 0;
  let problem: string | null = null;
  const place = (entities: readonly DxfEntity[], m: Affine, within: Looks | null, path: readonly string[]): void => {
    for (const entity of entities) {
      if (problem !== null) return;
      visits += 1;
      if (visits > DXF_LIMITS.entities) { problem = `with its blocks put in, the drawing holds more than ${DXF_LIMITS.entities} entities`; return; }
      const looks = looksOf(entity, within, drawing);
      if (entity.kind === "TEXT") { if (texts.length < DXF_LIMITS.notes) texts.push(entity.text); }
      else if (entity.kind === "INSERT") insert(entity, m, looks, path);
      else if (entity.kind !== "POINT") {
        for (const curve of moveCurve(curveOf(entity), m)) {
          shapes.push({
            curve, source: entity.kind === "CONIC" ? entity.source : entity.kind, line: entity.line, bend: entity.bend, ...looks,
            dashed: drawing.lineTypes.get(looks.lineType.toUpperCase())?.dashed ?? !["CONTINUOUS", "BYLAYER", "BYBLOCK"].includes(looks.lineType.toUpperCase()),
          });
        }
      }
    }
  };
  const insert = (entity: DxfEntity & { kind: "INSERT" }, m: Affine, looks: Looks, path: readonly string[]): void => {
    const name = entity.block.toUpperCase();
    const block = drawing.blocks.get(name);
    if (!block) {
      if (notes.length < DXF_LIMITS.notes) notes.push({ line: entity.line, message: `INSERT: the block "${entity.block}" is not in the file; it is left out` });
      return;
    }
    if (path.includes(name)) { problem = `line ${entity.line}: the block "${entity.block}" puts itself in: ${[...path, name].slice(-4).join(" > ")}`; return; }
    if (path.length >= DXF_LIMITS.depth) { problem = `line ${entity.line}: blocks lie more than ${DXF_LIMITS.depth} deep within one another`; return; }
    const copies = entity.columns * entity.rows;
    if (copies > DXF_LIMITS.entities) { problem = `line ${entity.line}: the block "${entity.block}" is put in ${copies} times`; return; }
    const [c, s] = [Math.cos(entity.rotation), Math.sin(entity.rotation)];
    const side = entity.mirrored ? -1 : 1;
    const turn: Affine = [side * c, s, -side * s, c, 0, 0];
    const [sx, sy] = entity.scale;
    const scale: Affine = [sx, 0, 0, sy, -block.base[0] * sx, -block.base[1] * sy];
    for (let k = 0; k < copies && problem === null; k++) {
      const [column, row] = [k % entity.columns, Math.floor(k / entity.columns)];
      const own = composeAffine([1, 0, 0, 1, ...entity.at], composeAffine(turn, composeAffine([1, 0, 0, 1, column * entity.spacing[0], row * entity.spacing[1]], scale)));
      visits += 1;
      if (visits > DXF_LIMITS.entities) problem = `with its blocks put in, the drawing holds more than ${DXF_LIMITS.entities} entities`;
      else place(block.entities, composeAffine(m, own), looks, [...path, name]);
    }
  };
  place(drawing.entities, identityAffine, null, []);
  return problem === null ? ok({ shapes, texts, notes }) : fail(problem);
}

const curveOf = (entity: DxfEntity & { kind: Curve["kind"] }): Curve => entity;

/** Layer 0 within a block is the layer of the block's insertion; colour and line type may be the layer's or the block's. */
function looksOf(entity: DxfEntity, within: Looks | null, drawing: DxfDrawing): Looks {
  const name = entity.layer === "0" && within ? within.layer : entity.layer;
  const layer = drawing.layers.get(name);
  const byBlock = (value: string) => value.toUpperCase() === "BYBLOCK";
  const colour = entity.colour === 0 ? (within?.colour ?? 7) : entity.colour >= 256 || entity.colour < 0 ? (layer?.colour ?? 7) : entity.colour;
  const lineType = byBlock(entity.lineType) ? (within?.lineType ?? "CONTINUOUS") : entity.lineType.toUpperCase() === "BYLAYER" ? (layer?.lineType ?? "CONTINUOUS") : entity.lineType;
  return { layer: name, colour, lineType, hidden: entity.hidden || (within?.hidden ?? false) || (layer?.hidden ?? false) };
}
