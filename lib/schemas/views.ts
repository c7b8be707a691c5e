import type { LengthUnit } from "@/bending/core/units";
import type { PartDocument } from "@/bending/part/partDocument";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { PlanEnd } from "@/bending/plan/planEnd";
import type { MaterialFacts } from "@/bending/handbook/material";
import type { Machine } from "@/bending/tooling/machine";
import type { Tool } from "@/bending/tooling/tool";
import type { PlanCheckView } from "./planJobViews";
import type { SheetView } from "@/lib/sheet/sheetView";
import type { Role } from "./role";

/** What the API answers; times are ISO 8601 strings, lengths in mm unless a document carries its own units. */

export interface Page<T> {
  readonly items: readonly T[];
  readonly total: number;
  readonly page: number;
  readonly pageSize: number;
}

/** Query of every list: `?q=&sort=name&dir=asc&page=1&pageSize=25` plus the list's own filters. */
export interface ListQuery {
  readonly q?: string | undefined;
  readonly sort?: string | undefined;
  readonly dir?: "asc" | "desc" | undefined;
  readonly page?: number | undefined;
  readonly pageSize?: number | undefined;
}

/** A flat that would come out differently now than when it was stored: the shop has measured more, or the material has a new version. */
export interface FlatChange {
  /** Of the part's document, to show it in; the sizes are in mm. */
  readonly units: LengthUnit;
  readonly thenMm: readonly [width: number, depth: number];
  readonly nowMm: readonly [width: number, depth: number];
  /** What changed, such as "S235 2 mm, V 12 mm, 90°: 3 new trials on 2026-11-30". */
  readonly why: readonly string[];
}

export interface PartListItem {
  readonly id: string;
  readonly number: string;
  readonly name: string;
  readonly material: string;
  readonly thicknessMm: number;
  readonly bends: number;
  readonly flatWidthMm: number;
  readonly flatDepthMm: number;
  readonly revision: number;
  readonly releasedSheets: number;
  /** Null: the stored flat is what it would be now. */
  readonly flatChange: FlatChange | null;
  readonly updatedAt: string;
  readonly updatedBy: string;
}

export interface RevisionInfo {
  readonly id: string;
  readonly revision: number;
  readonly note: string;
  readonly createdAt: string;
  readonly createdBy: string;
}

export interface PartDetail {
  readonly id: string;
  readonly number: string;
  readonly name: string;
  /** Newest first. */
  readonly revisions: readonly RevisionInfo[];
  /** The revision asked for, or the newest. */
  readonly revision: RevisionInfo;
  readonly document: PartDocument;
  /** Of the revision shown. */
  readonly flatChange: FlatChange | null;
  readonly plans: readonly PlanListItem[];
}

export type { MaterialView } from "./materialViews";

export interface MachineView {
  readonly id: string;
  readonly name: string;
  readonly bedLengthMm: number;
  readonly maxForceKN: number;
  readonly daylightMm: number;
  /** The machine document (machine/1). */
  readonly document: unknown;
}

export type PieceState = "in rack" | "at brake" | "at regrind" | "withdrawn";

export interface PieceView {
  readonly id: string;
  readonly code: string;
  readonly lengthMm: number;
  readonly horn: "left" | "right" | "both" | null;
  readonly rack: string;
  readonly state: PieceState;
  readonly machine: string | null;
}

export interface ToolListItem {
  readonly code: string;
  readonly kind: "punch" | "die";
  readonly name: string;
  readonly angleDeg: number;
  /** Tip radius (punch) or shoulder radius (die). */
  readonly radiusMm: number;
  /** Dies only. */
  readonly vOpeningMm: number | null;
  readonly heightMm: number;
  readonly maxForcePerMetreKN: number;
  readonly pieces: number;
  readonly piecesInService: number;
  readonly lengthInServiceMm: number;
}

export interface ToolDetail extends ToolListItem {
  readonly tang: string;
  readonly profile: readonly (readonly [number, number])[];
  /** The slot of a two-stage hem die, mm; null on every other tool. */
  readonly flattening: { readonly floor: number; readonly back: number; readonly opening: number } | null;
  readonly pieceList: readonly PieceView[];
  readonly updatedAt: string;
}

export interface PlanListItem {
  readonly id: string;
  readonly partId: string;
  readonly partNumber: string;
  readonly partName: string;
  readonly revision: number;
  readonly machine: string;
  readonly status: PlanDocument["status"];
  readonly batch: number;
  readonly steps: number;
  readonly stations: number;
  readonly secondsPerPart: number;
  readonly setupSeconds: number;
  readonly origin: PlanOrigin;
  readonly createdAt: string;
  readonly createdBy: string;
}

/** Found by the planner, along a person's own order, or chosen among the other plans that a search gave. */
export type PlanOrigin = "planned" | "own order" | "chosen";

export interface PlanDetail extends PlanListItem {
  readonly plan: PlanDocument;
  /** The part document that was planned. */
  readonly document: PartDocument;
  readonly material: MaterialFacts;
  readonly machineId: string;
  readonly machineDocument: unknown;
  /** The machine document read: millimetres and radians. */
  readonly machineModel: Machine;
  /** The tools that the plan uses, as they were (tooling/1 document). */
  readonly tooling: unknown;
  /** The same tools read: millimetres and radians, with the pieces that were in service. */
  readonly tools: readonly Tool[];
  readonly sheets: readonly SheetListItem[];
  /** The plan that this one was made from; null for one that was planned afresh. */
  readonly fromPlanId: string | null;
  /** What ended the search, and the time that it was given. */
  readonly ended: PlanEnd;
  readonly limitSeconds: number;
  /** Newest of the times that it was looked over again. */
  readonly lastCheck: PlanCheckView | null;
}

export type { PlanJobView } from "./planJobViews";
export type { PlanShopView } from "./planShopView";

export type SheetState = "draft" | "released" | "superseded";

export interface SheetListItem {
  readonly id: string;
  readonly number: string;
  readonly state: SheetState;
  readonly partNumber: string;
  readonly partName: string;
  readonly revision: number;
  readonly machine: string;
  readonly bends: number;
  readonly batch: number;
  readonly planId: string;
  readonly releasedAt: string | null;
  readonly releasedBy: string | null;
  /** Null: nothing has changed that its flat follows from, or it is not on the floor. */
  readonly flatChange: FlatChange | null;
  readonly createdAt: string;
}

export interface SheetDetail extends SheetListItem {
  readonly partId: string;
  readonly machineId: string;
  /** What the sheet says: as frozen at its release, or as it would be frozen now. */
  readonly view: SheetView;
  /** The part's newest revision; higher than `revision`: the part has changed since. */
  readonly latestRevision: number;
}

export interface ActivityItem {
  readonly id: string;
  readonly at: string;
  readonly actor: string;
  readonly action: string;
  readonly subject: string;
  readonly detail: string;
}

export interface PersonItem {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  /** False: the account is switched off. */
  readonly active: boolean;
}
