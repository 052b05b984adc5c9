import { useSuspenseQuery } from '@tanstack/react-query'
import { Link, useSearchParams } from 'react-router-dom'
import { isKindKey, kinds } from '#shared/kinds/index'
import type { Proposal } from '#shared/schemas/proposals'
import { reasons } from '#shared/schemas/review'
import { Button } from '../../../components/ui/button'
import { buttonClass } from '../../../components/ui/button-class'
import { ErrorState } from '../../../components/ui/error-state'
import { paths } from '../../../config/paths'
import { apiBase } from '../../../lib/api-client'
import { useApp } from '../../../lib/app-context'
import { printDate } from '../../../lib/print-date'
import { usePrinter } from '../../../lib/use-printer'
import { proposalQuery } from '../api/proposal-query'
import { statusMeaning, statusTextClasses, statusWords } from '../status-words'
import { useTurn } from '../use-turn'
import { ProposedValues } from './proposed-values'
import { Talk } from './talk'

const reasonWords: Readonly<Record<string, string>> = { ...reasons['send-back'], ...reasons.decline }

const amendHref = ({ id, gear, kind }: Proposal): string =>
  gear ? `${paths.gearEdit(gear.slug)}?proposal=${id}` : `${paths.gearNew}?kind=${kind}&proposal=${id}`

function Decision({ decision }: { readonly decision: NonNullable<Proposal['decision']> }) {
  const { reasonCode, words, by, at } = decision
  return (
    <section className="mt-6 border border-l-[5px] border-ink bg-sheet px-4 py-3" aria-label="Decision">
      <p className="text-sm text-ink-soft">
        {by}, {printDate(at)}
      </p>
      {reasonCode !== null && <p className="font-semibold">{reasonWords[reasonCode] ?? reasonCode}</p>}
      {words !== null && <p className="max-w-prose break-words whitespace-pre-line">{words}</p>}
    </section>
  )
}

function Files({ files }: Pick<Proposal, 'files'>) {
  if (files.length === 0) return null
  return (
    <section className="mt-8" aria-labelledby="files-title">
      <h2 id="files-title">Evidence</h2>
      <ul className="mt-2 flex flex-wrap gap-3">
        {files.map(({ id, kind, caption }) => {
          const href = `${apiBase}/evidence/${encodeURIComponent(id)}`
          return (
            <li key={id}>
              <a href={href} className="link block" target="_blank" rel="noopener">
                {kind === 'photo' ? (
                  <img
                    src={`${href}/thumbnail`}
                    alt={caption ?? 'A photo that backs it'}
                    width={160}
                    height={120}
                    className="h-30 w-40 border border-rule object-cover"
                  />
                ) : (
                  (caption ?? 'A document that backs it (PDF)')
                )}
              </a>
            </li>
          )
        })}
      </ul>
    </section>
  )
}

/** One proposal: what it says, where it stands, what was said of it, and what its author can do. */
export function ProposalPage({ id }: { readonly id: string }) {
  const { api } = useApp()
  const printer = usePrinter()
  const [params] = useSearchParams()
  const { data } = useSuspenseQuery(proposalQuery(api, id))
  const { proposal } = data
  const { take, failure, isPending, turn } = useTurn(data)
  const { status, gear, kind, brand, model, can, decision, summary } = proposal
  const name = [brand, model].filter(Boolean).join(' ') || 'a piece without a name yet'
  const label = isKindKey(kind) ? kinds[kind].label : kind
  return (
    <>
      <p className="text-sm text-ink-soft">
        <Link to={paths.proposals} className="link">
          My proposals
        </Link>
      </p>
      <h1 className="mt-1">{gear ? `Change of ${name}` : `New ${label}: ${name}`}</h1>
      {params.get('sent') === '1' && status === 'pending' && (
        <p role="status" className="mt-3 border border-l-[5px] border-fits bg-sheet px-4 py-3">
          <strong className="font-semibold">Sent.</strong> Thank you. You get a letter when a moderator has looked at
          it.
        </p>
      )}
      <p className="mt-3">
        <strong className={`font-semibold ${statusTextClasses[status]}`}>{statusWords[status]}.</strong>{' '}
        {statusMeaning[status]}
      </p>
      {summary !== null && <p className="mt-1 max-w-prose text-ink-soft">{summary}</p>}
      {decision && <Decision decision={decision} />}
      <p className="mt-5 flex flex-wrap gap-3">
        {can.amend && (
          <Link
            to={amendHref(proposal)}
            className={buttonClass({ variant: status === 'sent-back' ? 'primary' : 'plain' })}
          >
            {status === 'draft' ? 'Go on with it' : 'Amend it'}
          </Link>
        )}
        {can.submit && (
          <Button isBusy={isPending} onClick={() => take({ kind: 'submit' })}>
            Send it in as it is
          </Button>
        )}
        {can.withdraw && (
          <Button isBusy={isPending} onClick={() => take({ kind: 'withdraw' })}>
            Take it back
          </Button>
        )}
        {gear && (
          <Link
            to={paths.gear(gear.slug)}
            className={buttonClass({ variant: status === 'approved' ? 'primary' : 'plain' })}
          >
            See the piece
          </Link>
        )}
      </p>
      {failure && turn !== 'say' && (
        <div className="mt-4">
          <ErrorState title={failure.title}>
            {failure.status === 412
              ? 'It was changed meanwhile. It is shown as it stands now; look, then press again.'
              : failure.message}
          </ErrorState>
        </div>
      )}
      <section className="mt-8" aria-labelledby="values-title">
        <h2 id="values-title">What is proposed</h2>
        <div className="mt-2">
          <ProposedValues proposal={proposal} printer={printer} />
        </div>
      </section>
      <Files files={proposal.files} />
      <Talk
        proposal={proposal}
        isBusy={isPending && turn === 'say'}
        error={failure && turn === 'say' ? `${failure.message} Your words are kept.` : undefined}
        onSay={(words, onTaken) => take({ kind: 'say', words }, { onSuccess: onTaken })}
      />
    </>
  )
}
