import type { Connection } from "../connection";

export interface NewEvent {
  /** Null for someone who is not, or not yet, signed in. */
  readonly actorId: string | null;
  /** The name as it is now: it stays readable when the person is renamed or gone. */
  readonly actor: string;
  /** What was done, as words of the past: "released a sheet". */
  readonly action: string;
  /** What it was done to, e.g. "RS-1040 rev 3"; "" when it was nothing in particular. */
  readonly subject: string;
  readonly detail?: string;
}

/** Give it the transaction of the change, so that neither is kept without the other. */
export async function insertEvent(db: Connection, event: NewEvent): Promise<void> {
  await db("audit_events").insert({
    actor_id: event.actorId,
    actor: event.actor.slice(0, 200),
    action: event.action,
    subject: event.subject.slice(0, 300),
    detail: (event.detail ?? "").slice(0, 2000),
  });
}
