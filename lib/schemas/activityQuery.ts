import type { z } from "zod";
import { listQuerySchema } from "./listQuery";

export const activityQuerySchema = listQuerySchema(["at", "actor", "action", "subject"], "at", "desc");
export type ActivityQuery = z.output<typeof activityQuerySchema>;
