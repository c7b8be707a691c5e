import type { Permission } from "./permissions";

/** What a page or a route asks of whoever calls it. */
export type Access = Permission | "signed in" | "public";

/** Every page, by its path in the tree of pages (folders in round brackets left out). */
export const pageAccess = {
  "/": "signed in",
  "/sign-in": "public",
  "/forbidden": "signed in",
  "/parts": "parts:read",
  "/parts/new": "parts:write",
  "/parts/[id]": "parts:read",
  "/parts/[id]/edit": "parts:write",
  "/plans": "plans:read",
  "/plans/[id]": "plans:read",
  "/sheets": "sheets:drafts",
  "/sheets/[id]": "sheets:drafts",
  "/tools": "tools:read",
  "/tools/new": "tools:write",
  "/tools/[code]": "tools:read",
  "/machines": "machines:read",
  "/materials": "materials:read",
  "/people": "people:read",
  "/activity": "activity:read",
  "/floor": "floor:read",
  "/floor/[id]": "floor:read",
  "/print/[id]": "sheets:read",
} as const satisfies Record<string, Access>;

/** Every method of every route handler. */
export const apiAccess = {
  "GET /api/auth/[...nextauth]": "public",
  "POST /api/auth/[...nextauth]": "public",
  "GET /api/parts": "parts:read",
  "POST /api/parts": "parts:write",
  "GET /api/parts/[id]": "parts:read",
  "DELETE /api/parts/[id]": "parts:write",
  "POST /api/parts/[id]/revisions": "parts:write",
  "GET /api/parts/[id]/document": "parts:read",
  "GET /api/tools": "tools:read",
  "POST /api/tools": "tools:write",
  "GET /api/tools/[code]": "tools:read",
  "PATCH /api/tools/[code]": "tools:write",
  "POST /api/tools/[code]/pieces": "tools:write",
  "PATCH /api/pieces/[id]": "tools:write",
  "GET /api/machines": "machines:read",
  "GET /api/shop-limits": "parts:read",
  "GET /api/materials": "materials:read",
  "GET /api/plans": "plans:read",
  "POST /api/plans": "plans:write",
  "GET /api/plan-jobs/[id]": "plans:read",
  "DELETE /api/plan-jobs/[id]": "plans:write",
  "GET /api/plans/[id]": "plans:read",
  "POST /api/plans/[id]/sheets": "plans:write",
  "GET /api/sheets": "sheets:read",
  "GET /api/sheets/[id]": "sheets:read",
  "POST /api/sheets/[id]/release": "sheets:release",
  "GET /api/sheets/[id]/pdf": "sheets:read",
  "GET /api/activity": "activity:read",
  "GET /api/people": "people:read",
} as const satisfies Record<string, Access>;

export type PagePath = keyof typeof pageAccess;
export type ApiKey = keyof typeof apiAccess;
