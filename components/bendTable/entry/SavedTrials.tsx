import { Notice } from "@/components/ui/Notice";
import { TextLink } from "@/components/ui/TextLink";
import type { AddedTrials } from "@/lib/schemas/bendTableViews";

/** What was saved, and the values that it went into. */
export function SavedTrials({ saved: { trials } }: { readonly saved: AddedTrials }) {
  const first = trials[0]?.number ?? "";
  const last = trials.at(-1)?.number ?? "";
  const keys = [...new Set(trials.flatMap(({ valueKey }) => valueKey ?? []))];
  return (
    <Notice tone="good" title={trials.length === 1 ? `Saved as ${first}` : `${trials.length} trials saved, ${first} to ${last}`} live>
      <p className="flex flex-wrap gap-x-4">{keys.length === 1 ? "The value:" : "The values:"} {keys.map((key) => <TextLink key={key} href={`/bend-table/values/${encodeURIComponent(key)}`}>{valueName(key)}</TextLink>)}</p>
    </Notice>
  );
}

const valueName = (key: string): string => key.replace(/deg$/, "°");
