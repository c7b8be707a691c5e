import { BufferAttribute, BufferGeometry } from "three";
import { bendArc } from "@/bending/part/bendArc";
import { bendDirections } from "@/bending/part/bendDirections";
import type { FlatRegion, PartModel } from "@/bending/part/partModel";
import { pointOnBendArc } from "@/bending/part/pointOnBendArc";
import { zoneStrips } from "@/bending/part/zoneStrips";

const STRIPS = 12;

/**
 * A bend zone with holes, notches or slanted ends at an angle: its convex pieces, each bent as a small plate, in the parent
 * face's sheet coordinates. Groups as for faces.
 */
export function zoneGeometry(part: PartModel, index: number, regions: readonly FlatRegion[], angle: number): BufferGeometry {
  const bend = part.bends[index];
  const corners: number[] = [];
  const [top, under, edges]: [number[], number[], number[]] = [[], [], []];
  if (bend !== undefined) {
    const { along, outward } = bendDirections(bend);
    const [sx, sy] = bend.zone[0];
    const arc = bendArc(part, bend, angle);
    const point = ([x, y]: readonly [number, number], z: number): number => {
      const a = (x - sx) * along[0] + (y - sy) * along[1];
      const u = (x - sx) * outward[0] + (y - sy) * outward[1];
      const [away, height] = pointOnBendArc(arc, u / bend.allowance, arc.sense * (arc.neutralHeight - z));
      return corners.push(sx + along[0] * a + outward[0] * away, sy + along[1] * a + outward[1] * away, height) / 3 - 1;
    };
    for (const piece of zoneStrips(part, index, regions, STRIPS)) {
      const upper = piece.map((p) => point(p, part.thickness));
      const lower = piece.map((p) => point(p, 0));
      piece.forEach((_, i) => {
        const next = (i + 1) % piece.length;
        if (i > 0 && next > 0) {
          top.push(upper[0] ?? 0, upper[i] ?? 0, upper[next] ?? 0);
          under.push(lower[0] ?? 0, lower[next] ?? 0, lower[i] ?? 0);
        }
        edges.push(lower[i] ?? 0, lower[next] ?? 0, upper[next] ?? 0, lower[i] ?? 0, upper[next] ?? 0, upper[i] ?? 0);
      });
    }
  }
  const geometry = new BufferGeometry();
  geometry.setAttribute("position", new BufferAttribute(new Float32Array(corners), 3));
  geometry.setIndex([...top, ...under, ...edges]);
  geometry.addGroup(0, top.length, 0);
  geometry.addGroup(top.length, under.length, 1);
  geometry.addGroup(top.length + under.length, edges.length, 2);
  const flat = geometry.toNonIndexed();
  flat.computeVertexNormals();
  geometry.dispose();
  return flat;
}
