import type { Connection } from "../connection";

/** A place of the shop's bend table; lengths in mm, the middle of the angle range in degrees. */
export interface ShopUseQuestion {
  readonly material: string;
  readonly thickness: number;
  readonly vOpening: number;
  readonly punchRadius: number;
  readonly angle: number;
}

export interface ShopUseRow {
  readonly part_id: string;
  readonly part_number: string;
  readonly planned_at: Date;
}

/** The newest plan whose flat stands on the trials of that place, alone or with neighbours. */
export async function findLastShopUse(db: Connection, at: ShopUseQuestion): Promise<ShopUseRow | undefined> {
  return db("plans as plan")
    .join("parts as part", "part.id", "plan.part_id")
    .join("part_revisions as revision", "revision.id", "plan.revision_id")
    .where("revision.material_id", at.material)
    .whereRaw(`exists (
      select 1
      from jsonb_path_query(plan.document, '$.flat.bends[*].basis.shop.places[*]') place,
        lateral (select case plan.document ->> 'units' when 'in' then 25.4 else 1 end as per) unit
      where abs((place ->> 'thickness')::float8 * per - :thickness) < :same and abs((place ->> 'vOpening')::float8 * per - :vOpening) < :same
        and (place ->> 'angle')::float8 = :angle
        and exists (select 1 from jsonb_array_elements_text(place -> 'punchRadii') radius where abs(radius::float8 * per - :punchRadius) < :same)
    )`, { ...at, same: SAME_MM })
    .orderBy("plan.created_at", "desc")
    .first<ShopUseRow | undefined>("part.id as part_id", "part.number as part_number", "plan.created_at as planned_at");
}

/** Places are filed to a hundredth of a millimetre; a plan in inches gives them back to a millionth of an inch. */
const SAME_MM = 0.005;
