import type { Basis } from '#shared/engine/types'

const words = {
  physics: 'computed from physics',
  standard: 'a named standard or code',
  practice: 'common practice',
} as const

/** Where a rule or number is from, marked for how far it may be trusted. */
export function BasisNote({ basis }: { readonly basis: Basis }) {
  return (
    <>
      <strong className="font-semibold text-ink">{words[basis.type]}</strong>
      {basis.type === 'practice' ? ', no published source' : `: ${basis.source}`}
    </>
  )
}
