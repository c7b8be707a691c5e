import { z } from "zod";

export const roles = ["engineer", "operator", "toolroom", "manager"] as const;
export const roleSchema = z.enum(roles);
export type Role = z.infer<typeof roleSchema>;
