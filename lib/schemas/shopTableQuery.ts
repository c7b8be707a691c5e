import { z } from "zod";
import { filledText } from "./plainText";

/** Query of GET /api/shop-table. */
export const shopTableQuerySchema = z.strictObject({ material: filledText(60) });
