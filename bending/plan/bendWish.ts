/** What a person asks of the stroke that makes a bend: the face in front, the tools. */
export interface BendWish {
  readonly bend: string;
  readonly front?: string;
  readonly punch?: string;
  readonly die?: string;
}
