import { invariant } from "../core/invariant";
import type { Bend, Face, PartModel } from "./partModel";

/**
 * The same part with another face as its base: that face lies still, and the bends between it and the old base carry the other
 * way. The sheet, the names and which side is the top stay; faces and bends are numbered anew, from the new base outwards.
 */
export function reroot(part: PartModel, base: number): PartModel {
  invariant(part.faces[base], "reroot: a face of the part");
  const faces: number[] = [base];
  const bends: { readonly index: number; readonly turned: boolean }[] = [];
  const seen = new Set(faces);
  for (let next = 0; next < faces.length; next++) {
    part.bends.forEach((bend, index) => {
      const turned = bend.child === faces[next];
      if (!turned && bend.parent !== faces[next]) return;
      const other = turned ? bend.parent : bend.child;
      if (seen.has(other)) return;
      seen.add(other);
      faces.push(other);
      bends.push({ index, turned });
    });
  }
  const newFace = new Map(faces.map((old, i) => [old, i]));
  const newBend = new Map(bends.map(({ index }, i) => [index, i]));
  const among = (indices: readonly number[], map: ReadonlyMap<number, number>) => indices.map((i) => map.get(i) ?? 0).sort((a, b) => a - b);
  return {
    ...part,
    faces: faces.map((old, i): Face => ({ ...faceAt(part, old), bend: i === 0 ? null : i - 1 })),
    bends: bends.map(({ index, turned }): Bend => {
      const bend = bendAt(part, index);
      const carried = turned ? turnedRound(bend) : bend;
      return {
        ...carried,
        parent: newFace.get(carried.parent) ?? 0,
        child: newFace.get(carried.child) ?? 0,
        strokeWith: bend.strokeWith === null ? null : newBend.get(bend.strokeWith) ?? null,
      };
    }),
    holesAcross: part.holesAcross.map((hole) => ({ ...hole, bends: among(hole.bends, newBend), faces: among(hole.faces, newFace) })),
  };
}

function turnedRound(bend: Bend): Bend {
  const [parentStart, childStart, childEnd, parentEnd] = bend.zone;
  return { ...bend, parent: bend.child, child: bend.parent, line: [bend.line[1], bend.line[0]], zone: [childEnd, parentEnd, parentStart, childStart] };
}

function faceAt(part: PartModel, index: number): Face {
  const face = part.faces[index];
  invariant(face, "reroot: a face of the part");
  return face;
}

function bendAt(part: PartModel, index: number): Bend {
  const bend = part.bends[index];
  invariant(bend, "reroot: a bend of the part");
  return bend;
}
