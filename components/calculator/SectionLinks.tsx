import { sections } from "@/lib/calculator/sections";

/** The questions of the page, to jump to. */
export function SectionLinks() {
  return (
    <nav aria-label="Questions" className="mb-5">
      <ul className="flex flex-wrap gap-1.5">
        {sections.map(({ id, title }) => <li key={id}><a href={`#${id}`} className="inline-flex min-h-8 items-center rounded border border-rule-strong bg-sheet px-2.5 text-sm hover:border-ink hover:bg-wash">{title}</a></li>)}
      </ul>
    </nav>
  );
}
