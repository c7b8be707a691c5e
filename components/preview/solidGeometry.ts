import { BufferAttribute, BufferGeometry } from "three";
import type { SolidMesh } from "@/bending/exchange/step/solidMesh";

/** A solid's faces as one geometry, with a group for each run of faces that `groupOf` puts together. */
export function solidGeometry(mesh: SolidMesh, groupOf: (face: number) => number): BufferGeometry {
  const indexed = new BufferGeometry();
  indexed.setAttribute("position", new BufferAttribute(new Float32Array(mesh.positions), 3));
  indexed.setIndex([...mesh.triangles]);
  // Corners of their own for each triangle keep plane faces flat to the light.
  const geometry = indexed.toNonIndexed();
  indexed.dispose();
  geometry.computeVertexNormals();
  mesh.faces.forEach(([first, count], face) => { if (count > 0) geometry.addGroup(first, count, groupOf(face)); });
  return geometry;
}
