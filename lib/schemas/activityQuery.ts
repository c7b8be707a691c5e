import type { z } from "zod";
import { listQuerySchema } from "./listQuery";

export const activitySorts = ["at", "actor", "action", "subject"] as const;
export const activityQuerySchema = listQuerySchema(activitySorts, "at", "desc");
export type ActivityQuery = z.output<typeof activityQuerySchema>;
