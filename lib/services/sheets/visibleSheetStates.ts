import type { SheetRowState } from "@/db/sheets/sheetRow";
import { can } from "@/lib/auth/permissions";
import type { Role } from "@/lib/schemas/role";

/** Drafts and superseded sheets are the office's; whoever works from sheets sees the released ones alone. */
export const visibleSheetStates = (role: Role): readonly SheetRowState[] =>
  can(role, "sheets:drafts") ? ["draft", "released", "superseded"] : ["released"];
