import type { FieldProblem } from "../core/problem";
import { materialFields, type MaterialFacts } from "./material";

/** What sheet metals can have, widely: a number outside is a slip of the unit or of the finger. */
const TENSILE_MPA = [20, 3000] as const;
const MODULUS_GPA = [10, 500] as const;
const DENSITY = [500, 25_000] as const;
/** Of the V: air bending gives about 0.1 to 0.25. */
const RADIUS_PER_V = [0.02, 0.6] as const;
const RADIUS_PER_THICKNESS_MOST = 30;
const THICKNESS_MOST_MM = 100;
const RADIUS_MOST_MM = 500;

const inside = (value: number, [low, high]: readonly [number, number]): boolean => value >= low && value <= high;

/** What is wrong with a material's values, each with what would be right in MPa, GPa, kg/m³ and mm. */
export function materialProblems(facts: MaterialFacts): readonly FieldProblem[] {
  return [...strengthProblems(facts), ...elasticProblems(facts), ...radiusProblems(facts), ...tableProblems(facts), ...originProblems(facts)];
}

function strengthProblems({ tensile: [low, high], yield: strength }: MaterialFacts): readonly FieldProblem[] {
  const range = `must be ${TENSILE_MPA[0]} to ${TENSILE_MPA[1]} MPa`;
  return [
    ...[low, high].flatMap((value, end) => (inside(value, TENSILE_MPA) ? [] : [{ path: `tensile[${end}]`, message: range }])),
    ...(low > high ? [{ path: "tensile[1]", message: `must be at least the lowest, ${low} MPa` }] : []),
    ...(!(strength > 0) ? [{ path: "yield", message: "must be over 0 MPa" }] : strength > high ? [{ path: "yield", message: `must be at most the highest tensile strength, ${high} MPa` }] : []),
  ];
}

function elasticProblems({ modulus, density }: MaterialFacts): readonly FieldProblem[] {
  const gpa = modulus / 1000;
  const problems: FieldProblem[] = [];
  if (!inside(gpa, MODULUS_GPA)) problems.push({ path: "modulus", message: `must be ${MODULUS_GPA[0]} to ${MODULUS_GPA[1]} GPa${inside(gpa / 1000, MODULUS_GPA) ? `; ${gpa} looks like MPa, which is ${gpa / 1000} GPa` : ""}` });
  if (!inside(density, DENSITY)) problems.push({ path: "density", message: `must be ${DENSITY[0]} to ${DENSITY[1]} kg/m³${inside(density * 1000, DENSITY) ? `; ${density} looks like g/cm³, which is ${Number((density * 1000).toFixed(3))} kg/m³` : ""}` });
  return problems;
}

function radiusProblems({ naturalRadiusRatio, defaultRadiusPerThickness, allowance }: MaterialFacts): readonly FieldProblem[] {
  return [
    ...(inside(naturalRadiusRatio, RADIUS_PER_V) ? [] : [{ path: "naturalRadiusRatio", message: `must be ${RADIUS_PER_V[0]} to ${RADIUS_PER_V[1]} of the V opening` }]),
    ...(inside(defaultRadiusPerThickness, [0, RADIUS_PER_THICKNESS_MOST]) ? [] : [{ path: "defaultRadiusPerThickness", message: `must be 0 to ${RADIUS_PER_THICKNESS_MOST} times the thickness` }]),
    ...(allowance.rule === "k" && !(allowance.k > 0 && allowance.k <= 1) ? [{ path: "allowance.k", message: "must be over 0 and at most 1" }] : []),
  ];
}

function tableProblems({ minimumRadii: table }: MaterialFacts): readonly FieldProblem[] {
  if (table === null) return [];
  const most = table.as === "mm" ? RADIUS_MOST_MM : RADIUS_PER_THICKNESS_MOST;
  const unit = table.as === "mm" ? "mm" : "times the thickness";
  if (table.rows.length === 0) return [{ path: "minimumRadii.rows", message: "must have a row; without a table no smallest radius is known" }];
  return table.rows.flatMap(({ upTo, across, along }, row) => {
    const before = row === 0 ? 0 : (table.rows[row - 1]?.upTo ?? 0);
    return [
      ...(upTo > before && upTo <= THICKNESS_MOST_MM ? [] : [{ path: `minimumRadii.rows[${row}].upTo`, message: upTo <= before ? `must be over ${before} mm, the row before` : `must be at most ${THICKNESS_MOST_MM} mm` }]),
      ...([["across", across], ["along", along]] as const).flatMap(([name, value]) =>
        (value === null || inside(value, [0, most]) ? [] : [{ path: `minimumRadii.rows[${row}].${name}`, message: `must be 0 to ${most} ${unit}` }])),
    ];
  });
}

function originProblems({ origins }: MaterialFacts): readonly FieldProblem[] {
  return materialFields.filter((field) => origins[field].text.trim() === "").map((field) => ({ path: `origins.${field}`, message: "must say where the value is from" }));
}
