import type { Kernel } from "./kernel";
import { STEP_LIMITS } from "./stepLimits";

/** Of a page of the kernel's memory. */
const PAGE_BYTES = 65_536;

export interface LoadedKernel {
  readonly kernel: Kernel;
  /** It has asked for more memory than it may have; what it was doing then has failed. */
  readonly ranOut: () => boolean;
}

/**
 * The geometry kernel, about half a second to load. It is left out of every bundle: Node finds the package and its binary beside it.
 * Its memory stops growing at the limit (bytes); what asks for more then fails instead of taking the machine's.
 */
export async function loadKernel(limit: number = STEP_LIMITS.kernelBytes): Promise<LoadedKernel> {
  const { default: start } = await import(/* turbopackIgnore: true */ /* webpackIgnore: true */ "replicad-opencascadejs");
  const silent = () => undefined;
  const kernel = await start({ print: silent, printErr: silent });
  const memory = kernel.wasmMemory;
  const grow = memory.grow.bind(memory);
  let refused = false;
  memory.grow = (pages) => {
    refused ||= memory.buffer.byteLength + pages * PAGE_BYTES > limit;
    if (refused) throw new RangeError("the kernel's memory is at its limit");
    return grow(pages);
  };
  return { kernel, ranOut: () => refused };
}
