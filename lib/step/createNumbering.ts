import type { TopoDS_Shape } from "replicad-opencascadejs";
import type { Kernel } from "./kernel";

const HASH_MOST = 2_147_483_647;

/** Numbers shapes from 0 as they are first met; the same shape keeps its number whatever its orientation. */
export function createNumbering(kernel: Kernel): (shape: TopoDS_Shape) => number {
  const buckets = new Map<number, { readonly shape: TopoDS_Shape; readonly number: number }[]>();
  let next = 0;
  return (shape) => {
    const hash = kernel.ReplicadShapeHasher.HashCode(shape, HASH_MOST);
    const bucket = buckets.get(hash) ?? [];
    buckets.set(hash, bucket);
    const known = bucket.find((entry) => entry.shape.IsSame(shape));
    if (known) return known.number;
    bucket.push({ shape, number: next });
    next += 1;
    return next - 1;
  };
}
