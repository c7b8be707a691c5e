import { applyFrame } from "./applyFrame";
import type { Frame } from "./frame";
import { turnByFrame } from "./turnByFrame";

/** First `inner`, then `outer`: applyFrame(composeFrames(outer, inner), p) = applyFrame(outer, applyFrame(inner, p)). */
export function composeFrames(outer: Frame, inner: Frame): Frame {
  return {
    x: turnByFrame(outer, inner.x),
    y: turnByFrame(outer, inner.y),
    z: turnByFrame(outer, inner.z),
    o: applyFrame(outer, inner.o),
  };
}
