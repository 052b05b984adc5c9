export const letters = ['A', 'B', 'C', 'D'] as const

/** Stands for a compared piece wherever its whole name would not fit. */
export function PieceLetter({ at }: { readonly at: number }) {
  return (
    <span className="inline-flex size-5 flex-none items-center justify-center rounded-ui border-[1.5px] border-ink font-mono text-xs font-semibold">
      {letters[at]}
    </span>
  )
}
