import type { MaterialView } from "@/lib/schemas/materialViews";

export interface MaterialSort {
  /** A column's key. */
  readonly sort: string;
  readonly dir: "asc" | "desc";
  readonly page: number;
}

const keys: Readonly<Record<string, (material: MaterialView) => string | number>> = {
  id: ({ id }) => id, name: ({ name }) => name, group: ({ group }) => group, standard: ({ standard }) => standard, tensile: ({ tensile }) => tensile[0], yield: (material) => material.yield,
  modulus: ({ modulus }) => modulus, density: ({ density }) => density, naturalRadiusRatio: (material) => material.naturalRadiusRatio, version: ({ version }) => version, changedAt: ({ changedAt }) => changedAt,
};

/** By one column; materials of the same value by their short name. */
export function sortMaterials(materials: readonly MaterialView[], { sort, dir }: MaterialSort): readonly MaterialView[] {
  const key = keys[sort] ?? (({ id }: MaterialView) => id);
  const sign = dir === "asc" ? 1 : -1;
  return [...materials].sort((a, b) => {
    const [one, other] = [key(a), key(b)];
    const by = typeof one === "number" && typeof other === "number" ? one - other : String(one).localeCompare(String(other), "en", { numeric: true });
    return by === 0 ? a.id.localeCompare(b.id, "en", { numeric: true }) : sign * by;
  });
}
