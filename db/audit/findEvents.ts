import type { Knex } from "knex";
import { contains } from "../contains";
import type { Connection } from "../connection";
import type { PageRequest, PageRows } from "../page";
import { pageOf } from "../pageOf";

export interface EventRow {
  readonly id: string;
  readonly at: Date;
  readonly actor: string;
  readonly action: string;
  readonly subject: string;
  readonly detail: string;
}

const columns = { at: "at", actor: "actor", action: "action", subject: "subject" } as const;
export type EventSort = keyof typeof columns;

export async function findEvents(db: Connection, request: PageRequest<EventSort>): Promise<PageRows<EventRow>> {
  const filtered: Knex.QueryBuilder = db("audit_events");
  if (request.q) {
    const pattern = contains(request.q);
    void filtered.where((any) => ["actor", "action", "subject", "detail"].forEach((column) => any.orWhereILike(column, pattern)));
  }
  return pageOf<EventRow, EventSort>(filtered, ["id", "at", "actor", "action", "subject", "detail"], columns, request, "id");
}
