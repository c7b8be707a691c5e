import type { ValueChange } from "@/lib/schemas/materialViews";

const figures = (text: string): string => (/^[-+\d.,\s]+$/.test(text) ? "num" : "");

/** What differs, value by value. */
export function ChangeList({ changes }: { readonly changes: readonly ValueChange[] }) {
  return (
    <ul>
      {changes.map(({ field, from, to }) => (
        <li key={field} className="break-words">
          <span className="text-ink-soft">{field}:</span> <span className={figures(from)}>{from === "" ? "empty" : from}</span> <span aria-hidden>→</span><span className="sr-only">becomes</span> <span className={`${figures(to)} font-medium`}>{to === "" ? "empty" : to}</span>
        </li>
      ))}
    </ul>
  );
}
