import type { Kernel } from "./kernel";
import { STEP_LIMITS } from "./stepLimits";

/** Of a page of the kernel's memory. */
const PAGE_BYTES = 65_536;

/**
 * The geometry kernel, about half a second to load. It is left out of every bundle: Node finds the package and its binary beside it.
 * Its memory stops growing at the limit; what asks for more then fails instead of taking the machine's.
 */
export async function loadKernel(): Promise<Kernel> {
  const { default: start } = await import(/* turbopackIgnore: true */ /* webpackIgnore: true */ "replicad-opencascadejs");
  const silent = () => undefined;
  const kernel = await start({ print: silent, printErr: silent });
  const memory = kernel.wasmMemory;
  const grow = memory.grow.bind(memory);
  memory.grow = (pages) => {
    if (memory.buffer.byteLength + pages * PAGE_BYTES > STEP_LIMITS.kernelBytes) throw new RangeError("the kernel's memory is at its limit");
    return grow(pages);
  };
  return kernel;
}
