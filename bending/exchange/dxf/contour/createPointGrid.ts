import type { Vec2 } from "../../../geometry/vec2";

export interface PointGrid {
  readonly add: (point: Vec2, id: number) => void;
  /** Ids within `radius` (at most the cell size) of the point. */
  readonly near: (point: Vec2, radius: number) => readonly number[];
}

/** Points sorted into square cells, to find neighbours without looking at all. */
export function createPointGrid(cell: number): PointGrid {
  const cells = new Map<string, { readonly point: Vec2; readonly id: number }[]>();
  const index = (value: number) => Math.floor(value / cell);
  return {
    add: (point, id) => {
      const key = `${index(point[0])},${index(point[1])}`;
      const list = cells.get(key);
      if (list) list.push({ point, id });
      else cells.set(key, [{ point, id }]);
    },
    near: (point, radius) => {
      const found: number[] = [];
      for (let x = index(point[0] - radius); x <= index(point[0] + radius); x++) {
        for (let y = index(point[1] - radius); y <= index(point[1] + radius); y++) {
          for (const entry of cells.get(`${x},${y}`) ?? []) {
            if (Math.hypot(entry.point[0] - point[0], entry.point[1] - point[1]) <= radius) found.push(entry.id);
          }
        }
      }
      return found;
    },
  };
}
