import type { Connection } from "../connection";
import { insertEvent, type NewEvent } from "./insertEvent";

/** Leaves out an event whose like (actor, action, subject) was kept in the last `minutes`: a flood of attempts makes one row. */
export async function insertEventOnce(db: Connection, event: NewEvent, minutes: number): Promise<void> {
  const like = await db("audit_events")
    .where({ actor: event.actor, action: event.action, subject: event.subject })
    .where("at", ">", db.raw("now() - make_interval(mins => ?)", [minutes]))
    .first("id");
  if (!like) await insertEvent(db, event);
}
