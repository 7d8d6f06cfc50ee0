/** Our mark: a link between two pivots, leaning like a slope. Says nothing itself; the name stands beside it. */
export function Mark({ size = 32 }: { size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 32 32" aria-hidden="true" focusable="false">
      <path d="M7 22.5 25 10" stroke="var(--lf-colors-bracken)" strokeWidth="10" strokeLinecap="round" />
      <circle cx="7" cy="22.5" r="2.4" fill="var(--lf-colors-chalk)" />
      <circle cx="25" cy="10" r="2.4" fill="var(--lf-colors-chalk)" />
    </svg>
  );
}
