import type { Role } from "@/lib/schemas/role";

/** Who may do what. Read by the server for every page and route, and by screens to leave out what would be refused. */
export const permissions = {
  "parts:read": ["engineer", "toolroom", "manager"],
  "parts:write": ["engineer"],
  "plans:read": ["engineer", "manager"],
  "plans:write": ["engineer"],
  /** Released sheets, and those they superseded. */
  "sheets:read": ["engineer", "operator", "toolroom", "manager"],
  /** Drafts as well: the office's view of sheets. */
  "sheets:drafts": ["engineer", "toolroom", "manager"],
  "sheets:release": ["engineer"],
  "floor:read": ["engineer", "operator", "manager"],
  "tools:read": ["engineer", "operator", "toolroom", "manager"],
  "tools:write": ["toolroom"],
  "machines:read": ["engineer", "toolroom", "manager"],
  "materials:read": ["engineer", "operator", "toolroom", "manager"],
  "materials:write": ["engineer"],
  "settings:read": ["engineer", "toolroom", "manager"],
  "settings:write": ["engineer"],
  "bendTable:read": ["engineer", "operator", "toolroom", "manager"],
  /** Entering trials and looking after the instruments. */
  "bendTable:write": ["engineer", "toolroom"],
  /** Whether a trial counts: leaving it out, bringing it back, withdrawing it. */
  "bendTable:judge": ["engineer"],
  "people:read": ["manager"],
  "activity:read": ["manager"],
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof permissions;

export function can(role: Role, permission: Permission): boolean {
  const allowed: readonly Role[] = permissions[permission];
  return allowed.includes(role);
}
