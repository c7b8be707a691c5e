/** What of a part is to be pointed out in 3D: faces hatched, bends with a bar along each side. Ids. */
export interface MarkedSheet {
  readonly faces: readonly string[];
  readonly bends: readonly string[];
}
