"use client";
import { Popover } from "radix-ui";
import type { Plain } from "@/bending/core/plain";
import type { LengthUnit } from "@/bending/core/units";
import type { AllowanceBasis, ShopBasis } from "@/bending/handbook/allowanceBasis";
import { allowanceText } from "@/lib/format/allowanceText";
import { fineLength } from "@/lib/format/fineLength";
import { formatAngle } from "@/lib/format/formatAngle";
import { formatFixed } from "@/lib/format/formatFixed";
import { formatLength } from "@/lib/format/formatLength";
import { Facts } from "./Facts";

interface AllowanceSourceProps {
  readonly bend: string;
  /** Lengths in mm. */
  readonly basis: Plain<AllowanceBasis>;
  readonly units: LengthUnit;
}

/** Where a bend's numbers are from, in a few words; opened, what they stand on and what the next source would have said. */
export function AllowanceSource({ bend, basis, units }: AllowanceSourceProps) {
  return (
    <Popover.Root>
      <Popover.Trigger aria-label={`${allowanceText(basis, units)}: where the numbers of ${bend} are from`}
        className="text-left underline decoration-dotted underline-offset-2 hover:decoration-solid">{allowanceText(basis, units)}</Popover.Trigger>
      <Popover.Portal>
        <Popover.Content sideOffset={4} collisionPadding={12} align="end" aria-label={`Where the numbers of ${bend} are from`}
          className="z-30 max-h-[80dvh] w-[min(26rem,calc(100vw-2rem))] overflow-y-auto border border-ink bg-paper p-4 text-sm shadow-lg">
          <p className="mb-2 text-base font-semibold">{bend}: {allowanceText(basis, units)}</p>
          <Facts rows={[
            { label: "Deduction", value: <span className="num">{fineLength(basis.deduction, units)}{basis.shop === null ? "" : ` ± ${fineLength(basis.shop.expanded, units)}`}</span> },
            { label: "K", value: <span className="num">{formatFixed(basis.k, 3)}</span> },
            ...(basis.shop === null ? [] : shopRows(basis.shop, units)),
            ...nextRows(basis, units),
          ]} />
          <p className="mt-3 text-ink-soft">Asked in this order: a K by hand, a rule that the part names, the shop’s own trials, the rule of the material.</p>
          <Popover.Close className="mt-3 text-accent-ink underline underline-offset-2">Close</Popover.Close>
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  );
}

const openings: Readonly<Record<ShopBasis["openingFrom"], string>> = {
  die: "of the die",
  radius: "which gives this inside radius",
  usual: "the usual one, no die is chosen yet",
};

function shopRows({ vOpening, openingFrom, count, spread, lastMeasured, places }: Plain<ShopBasis>, units: LengthUnit) {
  return [
    { label: "V opening", value: <><span className="num">{formatLength(vOpening, units)}</span>, {openings[openingFrom]}</> },
    { label: "Trials", value: <><span className="num">{count}</span>, the last of <span className="num">{lastMeasured}</span></> },
    { label: "Spread (standard deviation)", value: spread === null ? "not known of one trial" : <span className="num">{fineLength(spread, units)}</span> },
    ...(places.length < 2 ? [] : places.map((place) => ({
      label: `${formatLength(place.thickness, units)}, V ${formatLength(place.vOpening, units)}, ${formatAngle(place.angle)}`,
      value: <><span className="num">{formatFixed(place.weight * 100, 0)} %</span>, {place.count} {place.count === 1 ? "trial" : "trials"}</>,
    }))),
  ];
}

function nextRows({ deduction, next }: Plain<AllowanceBasis>, units: LengthUnit) {
  if (next === null) return [{ label: "Next in order", value: "no other source says anything" }];
  const off = next.deduction - deduction;
  return [{
    label: `Next in order: ${allowanceText(next, units)}`,
    value: <span className="num">{fineLength(next.deduction, units)} ({off < 0 ? "−" : "+"}{fineLength(Math.abs(off), units)})</span>,
  }];
}

