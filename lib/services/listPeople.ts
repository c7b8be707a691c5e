import { database } from "@/db/client";
import { findUsers } from "@/db/users/findUsers";
import type { PeopleQuery } from "@/lib/schemas/peopleQuery";
import type { Page, PersonItem } from "@/lib/schemas/views";

export async function listPeople(query: PeopleQuery): Promise<Page<PersonItem>> {
  const { users, total } = await findUsers(database(), query);
  const items = users.map(({ id, name, email, role, disabledAt }) => ({ id, name, email, role, active: disabledAt === null }));
  return { items, total, page: query.page, pageSize: query.pageSize };
}
