/** Section hatching; use as `fill={`url(#${id})`}`. */
export function Hatch({ id }: { readonly id: string }) {
  return (
    <pattern id={id} width="5" height="5" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
      <rect width="5" height="5" fill="var(--steel-100)" />
      <path d="M0 0v5" stroke="var(--steel-500)" strokeWidth="0.8" />
    </pattern>
  );
}
