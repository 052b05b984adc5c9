import { useState } from 'react'
import { Link } from 'react-router-dom'
import { getKind, type KindKey } from '#shared/kinds/index'
import type { Gear } from '#shared/schemas/gear'
import { paths } from '../../../config/paths'
import { usePrinter } from '../../../lib/use-printer'
import type { SavedProposal } from '../api/save-proposal'
import { typeProposal } from '../model/type-proposal'
import { createBase } from '../model/typed-form'
import { ProposeForm } from './propose-form'

export interface ProposePageProps {
  readonly kind: KindKey
  /** Null: a new piece. */
  readonly gear: Gear | null
  /** A proposal that is taken up again. */
  readonly saved: SavedProposal | null
}

const article = (word: string): string => (/^[aeiou]/i.test(word) ? 'an' : 'a')

/** The form with what it is for: a new piece, or a change of one on record. */
export function ProposePage({ kind, gear, saved }: ProposePageProps) {
  const printer = usePrinter()
  const [start] = useState(() => {
    const base = createBase(kind, gear, printer)
    return { base, typed: saved ? typeProposal(base, saved.proposal, printer) : base.typed }
  })
  const { label } = getKind(kind)
  const lastWords = saved?.proposal.status === 'sent-back' ? saved.proposal.words : null
  return (
    <>
      <p className="text-sm text-ink-soft">
        {gear ? (
          <Link to={paths.gear(gear.slug)} className="link">
            {gear.brand} {gear.model}
          </Link>
        ) : (
          <Link to={paths.gearNew} className="link">
            Another kind
          </Link>
        )}
      </p>
      <h1 className="mt-1">{gear ? `Correct ${gear.brand} ${gear.model}` : `Add ${article(label)} ${label}`}</h1>
      <p className="mt-2 max-w-prose">
        {gear
          ? 'Change what is wrong and fill in what is missing; the rest stays as it is.'
          : 'Say what you know and leave the rest empty: a few measured numbers are worth more than many guessed ones.'}{' '}
        Type in any unit: “4 1/2 in”, “30 cm”, “20 gal”. A moderator looks at it before it shows.
      </p>
      {lastWords !== null && (
        <div role="note" className="mt-4 border border-l-[5px] border-changes bg-sheet px-4 py-3">
          <strong className="font-semibold">It was sent back:</strong> {lastWords}
        </div>
      )}
      <ProposeForm place={gear ? gear.slug : `new-${kind}`} base={start.base} typed={start.typed} saved={saved} />
    </>
  )
}
