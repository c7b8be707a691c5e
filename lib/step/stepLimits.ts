/** What reading a STEP file may take; common practice, far above single sheet-metal parts. */
export const STEP_LIMITS = {
  bytes: 50_000_000,
  /** Faces in the file's text, and of the body that is read. */
  faces: 5_000,
  /** Bodies that are listed for a choice. */
  bodies: 50,
  /** Memory that the kernel may grow to. */
  kernelBytes: 1_500_000_000,
  /** Memory of the thread's own data. */
  heapMb: 768,
  milliseconds: 90_000,
} as const;
