import { Matrix4 } from "three";
import type { Frame } from "@/bending/geometry/frame";

/** The placement as three.js has it. */
export const frameMatrix = ({ x, y, z, o }: Frame): Matrix4 =>
  new Matrix4().set(x[0], y[0], z[0], o[0], x[1], y[1], z[1], o[1], x[2], y[2], z[2], o[2], 0, 0, 0, 1);
