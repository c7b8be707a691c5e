import type { PartModel } from "../../part/partModel";
import type { FoldedMesh } from "./foldedMesh";
import { foldedMeshes } from "./foldedMeshes";

const MAGIC = 0x46546c67;
const JSON_CHUNK = 0x4e4f534a;
const BINARY_CHUNK = 0x004e4942;
const [FLOAT, ARRAY_BUFFER] = [5126, 34962];
const METRES = 1 / 1000;

/**
 * The folded part as a binary glTF 2.0 file: metres, y up (glTF 2.0 specification, 3.4), a node for each face and bend, named after it, and a
 * material named after the part's. Layout of the container by section 4.4 of the specification.
 */
export function writeGlb(part: PartModel): Uint8Array {
  const meshes = foldedMeshes(part).filter(({ corners }) => corners.length > 0);
  const data = meshes.map(buffersOf);
  const lengths = data.map(({ positions }) => positions.byteLength);
  const views: object[] = [];
  const accessors: object[] = [];
  let offset = 0;
  data.forEach(({ positions, count, min, max }) => {
    for (const bounds of [{ min, max }, {}]) {
      accessors.push({ bufferView: views.length, componentType: FLOAT, count, type: "VEC3", ...bounds });
      views.push({ buffer: 0, byteOffset: offset, byteLength: positions.byteLength, target: ARRAY_BUFFER });
      offset += positions.byteLength;
    }
  });
  const json = {
    asset: { version: "2.0", generator: "Foldwright" },
    scene: 0,
    scenes: [{ name: part.name, nodes: [0] }],
    nodes: [{ name: part.name, children: meshes.map((_, i) => i + 1) }, ...meshes.map(({ name }, i) => ({ name, mesh: i }))],
    meshes: meshes.map(({ name, kind }, i) => ({ name, primitives: [{ attributes: { POSITION: 2 * i, NORMAL: 2 * i + 1 }, material: kind === "face" ? 0 : 1 }] })),
    materials: [material(part.material.id, [0.62, 0.65, 0.68, 1]), material(`${part.material.id}, bend`, [0.5, 0.56, 0.62, 1])],
    buffers: [{ byteLength: offset }],
    bufferViews: views,
    accessors,
  };
  const binary = new Uint8Array(offset);
  let at = 0;
  data.forEach(({ positions, normals }, i) => {
    binary.set(new Uint8Array(positions.buffer), at);
    binary.set(new Uint8Array(normals.buffer), at + (lengths[i] ?? 0));
    at += 2 * (lengths[i] ?? 0);
  });
  return container(new TextEncoder().encode(JSON.stringify(json)), binary);
}

const material = (name: string, colour: readonly number[]) => ({ name, pbrMetallicRoughness: { baseColorFactor: colour, metallicFactor: 0.6, roughnessFactor: 0.55 } });

/** Positions in metres and normals, z up made y up: x, z, -y. */
function buffersOf({ corners, normals }: FoldedMesh) {
  const turned = (points: FoldedMesh["corners"], scale: number) => new Float32Array(points.flatMap(([x, y, z]) => [x * scale, z * scale, -y * scale]));
  const positions = turned(corners, METRES);
  const [min, max] = [[Infinity, Infinity, Infinity], [-Infinity, -Infinity, -Infinity]];
  positions.forEach((value, i) => {
    min[i % 3] = Math.min(min[i % 3] ?? value, value);
    max[i % 3] = Math.max(max[i % 3] ?? value, value);
  });
  return { positions, normals: turned(normals, 1), count: corners.length, min, max };
}

/** Header and two chunks, each filled up to a multiple of four bytes (JSON with spaces, data with zeros). */
function container(json: Uint8Array, binary: Uint8Array): Uint8Array {
  const padded = (length: number) => Math.ceil(length / 4) * 4;
  const total = 12 + 8 + padded(json.length) + 8 + padded(binary.length);
  const file = new Uint8Array(total);
  const view = new DataView(file.buffer);
  [MAGIC, 2, total, padded(json.length), JSON_CHUNK].forEach((value, i) => view.setUint32(4 * i, value, true));
  file.fill(0x20, 20, 20 + padded(json.length));
  file.set(json, 20);
  const at = 20 + padded(json.length);
  view.setUint32(at, padded(binary.length), true);
  view.setUint32(at + 4, BINARY_CHUNK, true);
  file.set(binary, at + 8);
  return file;
}
