/**
 * A certificate, format `certificate/1`: the facts that a plan's bound stands on (or that there is no order), small enough
 * for a second program to check. It speaks of the order question with the bed left out, which no plan goes below.
 *
 * The bound is worked out again in three steps for each flat:
 *
 * 1. States are sets of formed bends: bit i of a number stands for `bends[i]`. A move may be made in a set S when none of its
 *    bends is in S and no fact `blocked` of that move has `(S & mask) === value`. It comes to S with the move's bends.
 * 2. A step costs, in seconds: `stroke`; for the first one `gaugeMove`; for every other one
 *    `flip` when `up` differs from the move before, one `turn` for every quarter turn begun between the headings (the shorter
 *    way round; after a flip opposite headings are the same; up to 0.01 degrees count as none), `gaugeMove` when the gauge
 *    settings that the two steps may have are both known and none is common to both; and `demeritSeconds` for each unmet wish.
 *    What a step may have follows from the facts `made` of that move with `(S & mask) === value`, S being the set before the
 *    step: the settings that all of them name (`gauges` null names every one), the largest of their `demerit`. Without such
 *    a fact the setting is unknown and no wish is unmet.
 * 3. `perPart` is not more than the cheapest way from the empty set to all bends (a plain dynamic programme over set and last
 *    move), and null exactly when there is no way. The flat's bound is `setup.seconds + batch x perPart`.
 *
 * The plan's own bound may be higher than the certificate's: what its search over beds excluded is not in here.
 * Each fact can be asked of the geometry by itself; what is not among the facts is taken as free.
 */
export interface PlanCertificate {
  readonly format: "certificate/1";
  readonly units: "mm";
  readonly batch: number;
  readonly times: { readonly flip: number; readonly turn: number; readonly stroke: number; readonly gaugeMove: number };
  readonly demeritSeconds: number;
  /** Every flat that was planned, one for each V when radii follow from the die. */
  readonly flats: readonly FlatCertificate[];
}

export interface FlatCertificate {
  /** The V that the flat's radii follow from, mm; null when the document gives them. */
  readonly vOpening: number | null;
  /** Ids; a bend's place is its bit. */
  readonly bends: readonly string[];
  readonly moves: readonly CertificateMove[];
  /** The tool pairs that the facts were asked of; `blocked` says that none of them can make the move. */
  readonly pairs: readonly { readonly punch: string; readonly die: string }[];
  readonly facts: readonly CertificateFact[];
  /** The cheapest setup that any bed of these pairs needs: so many stations of so many pieces altogether. */
  readonly setup: { readonly stations: number; readonly pieces: number; readonly seconds: number };
  /** Seconds of one part, unmet wishes weighed in, that no order goes below; null when there is no order. */
  readonly perPart: number | null;
}

export interface CertificateMove {
  /** Bends formed by the stroke, as bits. */
  readonly mask: number;
  /** Id of the face next to the (first) bend line on the operator's side. */
  readonly front: string;
  readonly up: 1 | -1;
  /** Degrees, 0 to 360, counter-clockwise in the unfolded sheet seen from the base's top. */
  readonly heading: number;
}

/** Holds in every set S with `(S & mask) === value`; `move` is an index of `moves`. */
export type CertificateFact =
  | { readonly kind: "blocked"; readonly move: number; readonly mask: number; readonly value: number; /** What stands in the way with one pair or another. */ readonly why: readonly string[] }
  | { readonly kind: "made"; readonly move: number; readonly mask: number; readonly value: number; /** The settings that the step can have, equal numbers being equal settings; null is any. */ readonly gauges: readonly number[] | null; /** Wishes left unmet at the least. */ readonly demerit: number };
