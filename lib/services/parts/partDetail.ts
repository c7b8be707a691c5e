import { partFlatChanges } from "../flatChange/partFlatChanges";
import { planListItem } from "../plans/planListItem";
import type { Connection } from "@/db/connection";
import { findPart, type RevisionRow } from "@/db/parts/findPart";
import { findPlans } from "@/db/plans/findPlans";
import { can } from "@/lib/auth/permissions";
import type { Role } from "@/lib/schemas/role";
import type { PartDetail, RevisionInfo } from "@/lib/schemas/views";

const PLANS_SHOWN = 50;

/** A part with a revision of it (the newest when none is named), and its plans for those who may see plans. */
export async function partDetail(db: Connection, role: Role, id: string, revision?: number): Promise<PartDetail | undefined> {
  const found = await findPart(db, id, revision);
  if (!found) return undefined;
  const plans = can(role, "plans:read")
    ? await findPlans(db, { partId: id, sort: "createdAt", dir: "desc", page: 1, pageSize: PLANS_SHOWN })
    : { rows: [] };
  return {
    id: found.part.id,
    number: found.part.number,
    name: found.revision.name,
    revisions: found.revisions.map(revisionInfo),
    revision: revisionInfo(found.revision),
    document: found.revision.document,
    flatChange: (await partFlatChanges(db, { revisionId: found.revision.id })).get(found.part.id) ?? null,
    plans: plans.rows.map(planListItem),
  };
}

const revisionInfo = (row: RevisionRow): RevisionInfo => ({
  id: row.id,
  revision: row.revision,
  note: row.note,
  createdAt: row.created_at.toISOString(),
  createdBy: row.created_by ?? "",
});
