import { z } from "zod";

export const idParams = z.object({ id: z.uuid("must be an id as the lists give it") });
