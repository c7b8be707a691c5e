export interface GuessedFacts {
  readonly thickness: { readonly value: number; readonly unit: "mm" | "in"; readonly from: string } | null;
  readonly material: string | null;
}

const NUMBER = String.raw`(\d{1,2}(?:[.,]\d{1,3})?|[.,]\d{1,3})`;
/** "t = 1.5", "THK 2mm", "Dicke: 3", "Ep. 2": a word for thickness before the number. */
const NAMED = new RegExp(String.raw`(?:^|[^\p{L}\d])(?:t|s|th|thk|thickness|dicke|stärke|ep|épaisseur|spessore|sp|espesor|dikte|tjocklek)\s*[=:._-]?\s*${NUMBER}\s*(mm|in|")?(?![\d.,])`, "iu");
/** "2mm" in a file's name. */
const WITH_UNIT = new RegExp(String.raw`(?:^|[^\d.,])${NUMBER}\s*(mm)(?![\p{L}\d])`, "iu");
const MOST_MM = 25;

/** Thickness and material as a file's name or the drawing's texts say them; only to be proposed. */
export function guessFacts(fileName: string, texts: readonly string[], materials: readonly string[]): GuessedFacts {
  const stem = fileName.replace(/\.[^.]*$/, "").replace(/_/g, " ");
  const lines = [stem, ...texts];
  const found = lines.map((line) => NAMED.exec(line)).find((match) => match !== null) ?? WITH_UNIT.exec(stem);
  const value = Number((found?.[1] ?? "").replace(",", "."));
  const unit = found?.[2] === undefined || found[2].toLowerCase() === "mm" ? "mm" : "in";
  const plausible = found !== null && value > 0 && value * (unit === "in" ? 25.4 : 1) <= MOST_MM;
  // The longest name first, so that 1.4301 is not taken for a shorter one within it.
  const material = [...materials].sort((a, b) => b.length - a.length).find((id) => lines.some((line) => names(line, id)));
  return { thickness: plausible ? { value, unit, from: found.input.trim().slice(0, 80) } : null, material: material ?? null };
}

function names(line: string, id: string): boolean {
  const at = line.toLowerCase().indexOf(id.toLowerCase());
  return at >= 0 && !/[\p{L}\d]/u.test(`${line[at - 1] ?? " "}${line[at + id.length] ?? " "}`);
}
