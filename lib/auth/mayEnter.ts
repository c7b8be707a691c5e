import type { Role } from "@/lib/schemas/role";
import type { Access } from "./accessTable";
import { can } from "./permissions";

/** Whether someone of this role (null: signed out) meets what a page or a route asks. */
export function mayEnter(role: Role | null, access: Access): boolean {
  if (access === "public") return true;
  if (role === null) return false;
  return access === "signed in" || can(role, access);
}
