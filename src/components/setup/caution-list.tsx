/** What is worth knowing of a piece, and changes no verdict. */
export function CautionList({ cautions }: { readonly cautions: readonly string[] }) {
  if (cautions.length === 0) return null
  return (
    <ul className="mt-1 space-y-0.5 text-sm text-ink-soft">
      {cautions.map((caution) => (
        <li key={caution}>
          <strong className="font-semibold">Caution:</strong> {caution}
        </li>
      ))}
    </ul>
  )
}
