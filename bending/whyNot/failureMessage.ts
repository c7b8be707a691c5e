import { formatBends } from "../plan/formatBends";
import type { FailedStroke, FailurePlace, PlanFailure } from "../plan/planFailure";

/** Strokes whose reasons are told in words; the rest is data only. */
const TOLD = 4;

/** How far it gets, what fails there and which other place would do, in whole sentences. */
export function failureMessage({ done, step, strokes }: Omit<PlanFailure, "message">): string {
  const far = done.length === 0 ? "" : `${done.join(", ")} can be made${step === null ? "; no stroke can follow" : ""}. `;
  const said = [...new Set(strokes.slice(0, TOLD).map((stroke) => strokeSentences(stroke, step)))];
  const rest = strokes.length > TOLD ? ` ${strokes.length - TOLD} further strokes cannot be made either.` : "";
  return `${far}${said.join(" ")}${rest}`;
}

function strokeSentences({ bends, reasons, wouldWork }: FailedStroke, step: number | null): string {
  const name = formatBends(bends);
  const place = step === null ? "" : `Step ${step}, ${name}, cannot be made. `;
  const first = reasons[0];
  const more = reasons.length > 1 ? ` (and ${reasons.length - 1} more in the way)` : "";
  const would = wouldWork.map(placeWords).join(", or ");
  return `${place}${first === undefined ? "" : `${first.message}${more}.`}${would === "" ? "" : ` ${name} by itself works ${would}.`}`;
}

function placeWords({ before, after }: FailurePlace): string {
  const words = [before.length > 0 ? `before ${before.join(" and ")}` : "", after.length > 0 ? `after ${after.join(" and ")}` : ""];
  return words.filter((word) => word !== "").join(" and ");
}
