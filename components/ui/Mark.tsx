/** The house mark: a strip with two bends. */
export function Mark({ className }: { readonly className?: string }) {
  return (
    <svg aria-hidden viewBox="3 3 26 26" className={className} fill="none" strokeWidth="4">
      <path d="M5 26h7a4 4 0 0 0 4-4V10a4 4 0 0 1 4-4h7" stroke="currentColor" />
      <path d="M16 16h9" stroke="var(--accent)" />
    </svg>
  );
}
