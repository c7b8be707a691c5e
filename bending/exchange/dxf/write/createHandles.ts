export interface Handles {
  /** A new handle, hexadecimal. */
  readonly next: () => string;
  /** The one after the last given. */
  readonly seed: () => string;
}

/** Every object of a DXF file from R13 on has a handle of its own; those of the file's frame are fixed and lie below. */
export function createHandles(): Handles {
  let last = 0xff;
  const text = (value: number) => value.toString(16).toUpperCase();
  return { next: () => text((last += 1)), seed: () => text(last + 1) };
}
