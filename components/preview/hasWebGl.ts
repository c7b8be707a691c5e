let known: boolean | null = null;

/** Whether this browser can draw in 3D; asked once. */
export function hasWebGl(): boolean {
  if (known === null) {
    try {
      const canvas = document.createElement("canvas");
      const context = canvas.getContext("webgl2");
      known = context !== null;
      context?.getExtension("WEBGL_lose_context")?.loseContext();
    } catch {
      known = false;
    }
  }
  return known;
}
