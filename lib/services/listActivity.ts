import { findEvents } from "@/db/audit/findEvents";
import { database } from "@/db/client";
import type { ActivityQuery } from "@/lib/schemas/activityQuery";
import type { ActivityItem, Page } from "@/lib/schemas/views";

export async function listActivity(query: ActivityQuery): Promise<Page<ActivityItem>> {
  const { rows, total } = await findEvents(database(), query);
  return { items: rows.map((row) => ({ ...row, at: row.at.toISOString() })), total, page: query.page, pageSize: query.pageSize };
}
