import type { WebGLProgramParametersWithUniforms } from "three";

/** Width of a hatch line and its gap together, in points of the screen. */
const PERIOD = 10;

/** Turns a material's surface into slanted stripes of its own colour and a darker one, so that it is told apart without colour. */
export function hatch(shader: WebGLProgramParametersWithUniforms): void {
  shader.fragmentShader = shader.fragmentShader.replace(
    "#include <color_fragment>",
    `#include <color_fragment>
    if (mod(gl_FragCoord.x + gl_FragCoord.y, ${PERIOD.toFixed(1)}) < ${(PERIOD * 0.4).toFixed(1)}) diffuseColor.rgb *= 0.35;`,
  );
}
