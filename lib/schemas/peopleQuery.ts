import type { z } from "zod";
import { listQuerySchema } from "./listQuery";

export const peopleQuerySchema = listQuerySchema(["name", "email", "role"], "name");
export type PeopleQuery = z.output<typeof peopleQuerySchema>;
