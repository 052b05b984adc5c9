/** The name beside a dimension line: two ticks and the arrows between. */
export function Wordmark() {
  return (
    <span className="inline-flex items-center gap-2 font-heading text-lg font-extrabold tracking-tight">
      <svg width="30" height="18" viewBox="0 0 30 18" aria-hidden="true" className="flex-none stroke-current">
        <path d="M1.25 1v16M28.75 1v16" strokeWidth="2.5" />
        <path d="M5 9h20M9.5 4.5 5 9l4.5 4.5M20.5 4.5 25 9l-4.5 4.5" fill="none" strokeWidth="2" />
      </svg>
      Stillfits
    </span>
  )
}
