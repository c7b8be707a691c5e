import type { PartDocument } from "@/bending/part/partDocument";

export interface DemonstrationPart {
  readonly number: string;
  readonly note: string;
  readonly document: PartDocument;
}

/** What the invented shop makes: the sheet metal of a field weather station. */
export const parts: readonly DemonstrationPart[] = [
  {
    number: "RS-101",
    note: "Holds the sensor arm to the mast.",
    document: {
      format: "part/1", name: "Mast bracket", units: "mm", material: "S235", thickness: 3,
      profile: { width: 120, legs: [60, 80, 60], bends: [{ angle: 90, direction: "up" }, { angle: 90, direction: "down" }] },
    },
  },
  {
    number: "RS-102",
    note: "Rim turned outwards so that the funnel sits on it.",
    document: {
      format: "part/1", name: "Rain-gauge tray", units: "mm", material: "1.4301", thickness: 1,
      base: { outline: [[0, 0], [240, 0], [240, 160], [0, 160]], holes: [{ circle: [120, 80], diameter: 30 }] },
      flanges: [
        { id: "front", on: "base", edge: 0, length: 36, angle: 90, direction: "up", start: 1.5, end: 1.5 },
        { id: "right", on: "base", edge: 1, length: 36, angle: 90, direction: "up", start: 1.5, end: 1.5 },
        { id: "back", on: "base", edge: 2, length: 36, angle: 90, direction: "up", start: 1.5, end: 1.5 },
        { id: "left", on: "base", edge: 3, length: 36, angle: 90, direction: "up", start: 1.5, end: 1.5 },
        { id: "frontRim", on: "front", edge: 2, length: 12, angle: 90, direction: "down" },
        { id: "rightRim", on: "right", edge: 2, length: 12, angle: 90, direction: "down" },
        { id: "backRim", on: "back", edge: 2, length: 12, angle: 90, direction: "down" },
        { id: "leftRim", on: "left", edge: 2, length: 12, angle: 90, direction: "down" },
      ],
    },
  },
  {
    number: "RS-103",
    note: "Tabs at the corners are spot-welded to the side walls.",
    document: {
      format: "part/1", name: "Battery box", units: "mm", material: "DC01", thickness: 1.5,
      base: { outline: [[0, 0], [184, 0], [184, 124], [0, 124]] },
      flanges: [
        { id: "left", on: "base", edge: 3, length: 70, angle: 90, direction: "up", start: 2, end: 2 },
        { id: "right", on: "base", edge: 1, length: 70, angle: 90, direction: "up", start: 2, end: 2 },
        { id: "front", on: "base", edge: 0, length: 70, angle: 90, direction: "up", start: 3, end: 3 },
        { id: "back", on: "base", edge: 2, length: 70, angle: 90, direction: "up", start: 3, end: 3 },
        { id: "frontRightTab", on: "front", edge: 1, length: 16, angle: 90, direction: "up", start: 0, end: 3 },
        { id: "frontLeftTab", on: "front", edge: 3, length: 16, angle: 90, direction: "up", start: 3, end: 0 },
        { id: "backLeftTab", on: "back", edge: 1, length: 16, angle: 90, direction: "up", start: 0, end: 3 },
        { id: "backRightTab", on: "back", edge: 3, length: 16, angle: 90, direction: "up", start: 3, end: 0 },
      ],
    },
  },
  {
    number: "RS-104",
    note: "Eleven of them make a shield; both edges are folded in for stiffness.",
    document: {
      format: "part/1", name: "Radiation-shield louvre", units: "mm", material: "AW-5754-H22", thickness: 1,
      profile: {
        width: 220, legs: [18, 48, 48, 18],
        bends: [{ angle: 120, direction: "up" }, { angle: 40, direction: "down" }, { angle: 120, direction: "up" }],
      },
    },
  },
  {
    number: "RS-105",
    note: "Screwed to the mast through the brims.",
    document: {
      format: "part/1", name: "Cable channel", units: "mm", material: "DC01", thickness: 1.5,
      profile: {
        width: 1200, legs: [20, 45, 60, 45, 20],
        bends: [{ angle: 90, direction: "up" }, { angle: 90, direction: "down" }, { angle: 90, direction: "down" }, { angle: 90, direction: "up" }],
      },
    },
  },
  {
    number: "RS-106",
    note: "Carries the solar panel; two to a station.",
    document: {
      format: "part/1", name: "Solar-panel rail", units: "mm", material: "AW-5754-H22", thickness: 2,
      profile: { width: 2400, legs: [40, 60, 40], bends: [{ angle: 90, direction: "up" }, { angle: 90, direction: "up" }] },
    },
  },
  {
    number: "RS-107",
    note: "Return flanges inwards hold the seal: bend them with a relieved punch.",
    document: {
      format: "part/1", name: "Door", units: "mm", material: "DC01", thickness: 1.5,
      base: { outline: [[0, 0], [520, 0], [520, 360], [0, 360]], holes: [{ slot: [[60, 170], [60, 190]], width: 12 }] },
      flanges: [
        { id: "hingeSide", on: "base", edge: 0, length: 24, angle: 90, direction: "up", start: 2, end: 2 },
        { id: "top", on: "base", edge: 1, length: 24, angle: 90, direction: "up", start: 2, end: 2 },
        { id: "lockSide", on: "base", edge: 2, length: 24, angle: 90, direction: "up", start: 2, end: 2 },
        { id: "bottom", on: "base", edge: 3, length: 24, angle: 90, direction: "up", start: 2, end: 2 },
        { id: "hingeReturn", on: "hingeSide", edge: 2, length: 15, angle: 90, direction: "up", start: 3, end: 3 },
        { id: "lockReturn", on: "lockSide", edge: 2, length: 15, angle: 90, direction: "up", start: 3, end: 3 },
      ],
    },
  },
  {
    number: "RS-108",
    note: "The open edge is hemmed so that it does not cut the cables.",
    document: {
      format: "part/1", name: "Cable cover", units: "mm", material: "DC01", thickness: 1,
      base: { outline: [[0, 0], [260, 0], [260, 70], [0, 70]] },
      flanges: [
        { id: "hem", on: "base", edge: 0, length: 15, angle: 180, direction: "up", hem: "closed" },
        { id: "wall", on: "base", edge: 2, length: 30, angle: 90, direction: "up" },
        { id: "foot", on: "wall", edge: 2, length: 15, angle: 90, direction: "down" },
      ],
    },
  },
];
