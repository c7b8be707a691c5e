/** Said while something is fetched; quiet, since it is short. */
export const Loading = ({ what }: { readonly what: string }) => <p role="status" className="py-10 text-center text-ink-faint">Loading {what}…</p>;
