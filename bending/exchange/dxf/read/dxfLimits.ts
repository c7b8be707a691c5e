/** What a drawing file may hold at most: common practice, far above a flat pattern; they bound memory and time. */
export const DXF_LIMITS = {
  /** Characters of the file. */
  characters: 50_000_000,
  /** Entities read, and entities drawn once blocks are put in. */
  entities: 200_000,
  /** Group codes of one entity. */
  tagsPerEntity: 200_000,
  /** Blocks within blocks. */
  depth: 16,
  /** Layers, line types and blocks each. */
  names: 10_000,
  /** Notes kept in full; the rest is counted. */
  notes: 200,
  /** Coordinates and sizes farther out than this are a mistake (drawing units). */
  coordinate: 1e8,
} as const;
