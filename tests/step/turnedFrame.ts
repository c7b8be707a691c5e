import type { Frame } from "@/bending/geometry/frame";

/** A placement that is along no axis: turned by three angles (radians) and moved. */
export function turnedFrame([a, b, c]: readonly [number, number, number], o: Frame["o"]): Frame {
  const [ca, sa, cb, sb, cc, sc] = [Math.cos(a), Math.sin(a), Math.cos(b), Math.sin(b), Math.cos(c), Math.sin(c)];
  return {
    x: [cb * cc, cb * sc, -sb],
    y: [sa * sb * cc - ca * sc, sa * sb * sc + ca * cc, sa * cb],
    z: [ca * sb * cc + sa * sc, ca * sb * sc - sa * cc, ca * cb],
    o,
  };
}
