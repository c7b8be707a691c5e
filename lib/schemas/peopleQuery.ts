import type { z } from "zod";
import { listQuerySchema } from "./listQuery";

export const peopleSorts = ["name", "email", "role"] as const;
export const peopleQuerySchema = listQuerySchema(peopleSorts, "name");
export type PeopleQuery = z.output<typeof peopleQuerySchema>;
