import type { ValueChange } from "@/lib/schemas/materialViews";

/** What differs, value by value. */
export function ChangeList({ changes }: { readonly changes: readonly ValueChange[] }) {
  return (
    <ul>
      {changes.map(({ field, from, to }) => (
        <li key={field} className="break-words">
          <span className="text-ink-soft">{field}:</span> <span className="num">{from === "" ? "empty" : from}</span> <span aria-hidden>→</span><span className="sr-only">becomes</span> <span className="num font-medium">{to === "" ? "empty" : to}</span>
        </li>
      ))}
    </ul>
  );
}
