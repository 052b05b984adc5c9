import { Link } from 'react-router-dom'
import { getKind, isKindKey } from '#shared/kinds/index'
import type { Proposal } from '#shared/schemas/proposals'
import { paths } from '../../../config/paths'
import { printSince } from '../model/print-span'
import { RecordWords } from './record-words'

export interface ProposalHeadProps {
  readonly proposal: Proposal
  readonly readAt: number
  /** Of the queue, to go back to. */
  readonly search: string
}

function Target({ proposal: { gear, kind, baseRevision } }: Pick<ProposalHeadProps, 'proposal'>) {
  const label = isKindKey(kind) ? getKind(kind).label : kind
  if (gear === null) return <>New {label}</>
  return (
    <>
      Change of a{/^[aeiou]/.test(label) ? 'n' : ''} {label}, from revision {baseRevision}
      {gear.revision !== baseRevision && <> (now {gear.revision})</>} ·{' '}
      <Link to={paths.gear(gear.slug)} className="link">
        public page
      </Link>{' '}
      ·{' '}
      <Link to={paths.gearHistory(gear.slug)} className="link">
        history
      </Link>
    </>
  )
}

/** What a proposal is about, who sent it in, and since when it waits. */
export function ProposalHead({ proposal, readAt, search }: ProposalHeadProps) {
  const { brand, model, author, isMine, record, submittedAt, summary } = proposal
  return (
    <>
      <p className="text-sm text-ink-soft">
        <Link to={`${paths.review}${search}`} className="link">
          Review desk
        </Link>
      </p>
      <h1 className="mt-1">
        {brand ?? 'Unnamed'} · {model ?? 'unnamed'}
      </h1>
      <p className="mt-1 text-ink-soft">
        <Target proposal={proposal} />
      </p>
      <p className="mt-1">
        From {isMine ? 'you' : author} (<RecordWords record={record} />)
        {submittedAt !== null && <>, sent in {printSince(submittedAt, readAt)} ago</>}
      </p>
      {summary !== null && (
        <blockquote className="mt-2 max-w-prose border-l-[3px] border-rule pl-3">{summary}</blockquote>
      )}
    </>
  )
}
