import type { Knex } from "knex";
import { contains } from "../contains";
import type { Connection } from "../connection";
import type { PageRequest } from "../page";
import { pageOf } from "../pageOf";
import type { User } from "./user";
import { userColumns, userFromRow, type UserRow } from "./userRow";

const columns = { name: "name", email: "email", role: "role" } as const;
export type UserSort = keyof typeof columns;

export async function findUsers(db: Connection, request: PageRequest<UserSort>): Promise<{ readonly users: readonly User[]; readonly total: number }> {
  const filtered: Knex.QueryBuilder = db("users");
  if (request.q) {
    const pattern = contains(request.q);
    void filtered.where((any) => any.whereILike("name", pattern).orWhereILike("email", pattern).orWhereILike("role", pattern));
  }
  const { rows, total } = await pageOf<UserRow, UserSort>(filtered, userColumns, columns, request, "id");
  return { users: rows.map(userFromRow), total };
}
