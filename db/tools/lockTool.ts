import type { Connection } from "../connection";

/** Holds a tool until the transaction ends, so that two changes of it are one after the other. */
export async function lockTool(within: Connection, code: string): Promise<void> {
  await within("tools").where({ code }).forUpdate().first("id");
}
