/** How a length changes with each bend's errors, by bend: millimetres a millimetre that its line lies off, millimetres a radian that it is over. */
export interface Drift {
  readonly bend: number;
  readonly shift: number;
  readonly turn: number;
}
