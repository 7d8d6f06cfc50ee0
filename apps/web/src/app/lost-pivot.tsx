/** Our mark as a drawing, the bolt of its upper pivot missing. */
export function LostPivot() {
  return (
    <svg viewBox="0 0 200 96" width="200" height="96" aria-hidden="true" focusable="false" fill="none">
      <g stroke="var(--lf-colors-ink)" strokeWidth="1.75" strokeLinejoin="round">
        <path d="M31.5 55.2 124 13.4A16 16 0 0 1 137.600 42.300L45.600 84.600A16 16 0 0 1 31.500 55.200Z" />
        <circle cx="38.500" cy="70" r="6" fill="var(--lf-colors-bracken)" stroke="none" />
        <circle cx="131" cy="28" r="6" />
      </g>
      <g stroke="var(--lf-colors-slate)" strokeWidth="0.9">
        <path strokeDasharray="12 3 2 3" d="M10 70h57M38.500 42v54M104 28h84M131 2v52" />
        <path strokeDasharray="4 3" d="M165 22h18v12h-18zM183 25h10v6h-10z" />
      </g>
    </svg>
  );
}
