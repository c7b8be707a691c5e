import { decodeDxf } from "@/bending/exchange/dxf/read/decodeDxf";
import { drawnPaths } from "@/bending/exchange/dxf/import/drawnPaths";
import { findFlat } from "@/bending/exchange/dxf/import/findFlat";
import { openDrawing, type OpenedDrawing } from "@/bending/exchange/dxf/import/openDrawing";
import type { DrawingAnswer, DrawingAsk } from "./drawingMessages";

let opened: OpenedDrawing | null = null;

function answer(ask: DrawingAsk): DrawingAnswer {
  const { id } = ask;
  if (ask.kind === "open") {
    const text = decodeDxf(new Uint8Array(ask.bytes));
    const read = text.ok ? openDrawing(text.value) : text;
    if (!read.ok) return { id, kind: "failed", message: read.error };
    opened = read.value;
    const { shapes, ...facts } = read.value;
    return shapes.length === 0 ? { id, kind: "failed", message: "the file holds no lines, arcs, circles, ellipses, splines or polylines" } : { id, kind: "opened", facts };
  }
  if (opened === null) return { id, kind: "failed", message: "no drawing is open" };
  const { shapes, groups } = opened;
  return { id, kind: "found", flat: findFlat(shapes, groups, ask.choices), paths: drawnPaths(shapes, groups, ask.choices.unit) };
}

self.onmessage = ({ data }: MessageEvent<DrawingAsk>) => { self.postMessage(answer(data)); };
