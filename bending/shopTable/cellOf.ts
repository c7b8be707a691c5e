import { mm, toRad, type Deg, type Mm, type Rad } from "../core/units";
import { bendAllowance } from "../handbook/bendAllowance";
import { bendDeduction } from "../handbook/bendDeduction";
import type { FiledTrial } from "./filedTrial";
import { modifiedZScores, OUTLIER_SCORE } from "./modifiedZScores";
import type { CellTrial, CellValue, ShopCell } from "./shopCell";
import { trialK } from "./trialK";
import type { RadiusSource } from "./trialResult";
import { COVERAGE, uncertain } from "./uncertain";

/** One cell out of its trials, for the inside radius that its V's trials share; an outlier is marked, and counts until a person excludes it. */
export function cellOf(key: string, filed: readonly FiledTrial[], shared: { readonly radius: Mm; readonly source: RadiusSource }, rangeOf: (middle: Deg) => readonly [Deg, Deg]): ShopCell {
  const [first] = filed;
  if (!first) throw new Error("invariant: a cell has a trial");
  const { measured, vOpening, punchRadius, angle } = first;
  const { radius } = shared;
  const thickness = measured.thicknessClass;
  const deductionOf = (k: number) => bendDeduction(toRad(angle), radius, thickness, bendAllowance(toRad(angle), radius, k, thickness));
  const plain = filed.map(({ trial, measured: own }): CellTrial => {
    const { k, deduction, budget } = trialK(own, radius, mm(0));
    return {
      id: trial.id, batch: trial.batch, measuredOn: trial.measuredOn, k, standardK: uncertain(k, budget, "onK").standard, deduction,
      deductionHere: deductionOf(k), score: null, outlier: false, excluded: trial.excluded ?? null,
    };
  });
  const counted = plain.filter((trial) => trial.excluded === null);
  const scores = modifiedZScores(counted.map(({ k }) => k), mean(counted.map(({ standardK }) => standardK)));
  const scoreOf = new Map(counted.map((trial, i) => [trial.id, scores?.[i] ?? null]));
  return {
    key, material: first.trial.material, thickness, vOpening, punchRadius, angle, angles: rangeOf(angle),
    radius, radiusSource: shared.source, followsDie: measured.followsDie,
    value: counted.length === 0 ? null : valueOf(counted, toRad(angle), thickness, deductionOf),
    trials: plain.map((trial) => ({ ...trial, score: scoreOf.get(trial.id) ?? null, outlier: (scoreOf.get(trial.id) ?? 0) > OUTLIER_SCORE })),
    outliersTold: scores !== null,
  };
}

function valueOf(counted: readonly CellTrial[], angle: Rad, thickness: Mm, deductionOf: (k: number) => Mm): CellValue {
  const k = mean(counted.map((trial) => trial.k));
  const spreadK = counted.length < 2 ? null : Math.sqrt(counted.reduce((sum, trial) => sum + (trial.k - k) ** 2, 0) / (counted.length - 1));
  // JCGM 100:2008, 4.2.3 and 5.1.2; one instrument's error is the same in every trial, so its share is not divided.
  const instrumentsK = mean(counted.map((trial) => trial.standardK));
  const standardK = Math.hypot((spreadK ?? 0) / Math.sqrt(counted.length), instrumentsK);
  const standard = angle * thickness * standardK;
  return {
    count: counted.length,
    k,
    spreadK,
    instrumentsK,
    standardK,
    deduction: { value: deductionOf(k), standard, expanded: COVERAGE * standard },
    spread: spreadK === null ? null : mm(angle * thickness * spreadK),
    lastMeasured: counted.reduce((last, trial) => (trial.measuredOn > last ? trial.measuredOn : last), ""),
  };
}

const mean = (values: readonly number[]): number => (values.length === 0 ? 0 : values.reduce((sum, value) => sum + value, 0) / values.length);
