import type { OpenCascadeInstance } from "replicad-opencascadejs";

/** The geometry kernel, loaded. */
export type Kernel = OpenCascadeInstance;
