import { Link } from 'react-router-dom'
import { getKind, type KindKey } from '#shared/kinds/index'
import type { ReplacementsAnswer } from '#shared/schemas/replacements'
import type { LinedUp } from '../../../components/drawings/swap-layout'
import { canLineUp, SwapLineup } from '../../../components/drawings/swap-lineup'
import { writeSetupHref } from '../../../components/setup/setup-href'
import { StandingCautions } from '../../../components/setup/standing-cautions'
import { EmptyState } from '../../../components/ui/empty-state'
import { ErrorState } from '../../../components/ui/error-state'
import { LiveStatus } from '../../../components/ui/live-status'
import { LoadingBlock } from '../../../components/ui/loading-block'
import { Skeleton } from '../../../components/ui/skeleton'
import { buttonClass } from '../../../components/ui/button-class'
import { paths } from '../../../config/paths'
import { describeSpecs } from '../../../lib/describe-specs'
import { findSurrounding } from '../model/find-surrounding'
import { useSwap, type Swap } from '../use-swap'
import { CandidateCard } from './candidate-card'

const letters = ['A', 'B', 'C'] as const

function nameGone({ gone }: ReplacementsAnswer): string {
  return gone.gear ? `${gone.gear.brand} · ${gone.gear.model}` : `the ${getKind(gone.kind).label}`
}

function countAnswers({ counts }: ReplacementsAnswer): string {
  return `${counts.fits} fit, ${counts.changes} fit with changes, ${counts.no} do not fit, ${counts.unknown} lack data.`
}

function lineUp({ gone, answers }: ReplacementsAnswer, name: string): readonly LinedUp[] {
  return [
    { letter: '×', name, specs: gone.specs, verdict: null },
    ...answers.slice(0, letters.length).map(({ gear, specs, verdict, place }, at) => ({
      letter: letters[at] ?? '',
      name: gear ? `${gear.brand} ${gear.model}` : 'this piece',
      specs,
      verdict,
      place,
    })),
  ]
}

function Found({ swap, found }: { readonly swap: Swap; readonly found: ReplacementsAnswer }) {
  const { printer, plan, visit } = swap
  const { gone, answers, failedBy, counts, next } = found
  const kind: KindKey = gone.kind
  const name = nameGone(found)
  const pieces = lineUp(found, name)
  const bare = Object.fromEntries(Object.entries(gone.specs).map(([key, value]) => [key, value?.value]))
  const { system } = printer
  const reportHref = writeSetupHref(paths.setup, visit.visit.raw, system)
  const isNothing = counts.fits + counts.changes === 0
  return (
    <>
      <LiveStatus message={countAnswers(found)} />
      <h1>What replaces {name}?</h1>
      <p className="mt-2 max-w-prose text-ink-soft">
        {[gone.quantity > 1 && `${gone.quantity} of them`, describeSpecs(kind, bare, printer)]
          .filter(Boolean)
          .join(': ')}
      </p>
      <p className="mt-2 max-w-prose text-lg">
        Of the {getKind(kind).plural} in the catalogue, {countAnswers(found)}
      </p>
      <p className="mt-3 print:hidden">
        <Link to={reportHref} className="link">
          Back to the setup
        </Link>
      </p>
      {answers.length > 0 && canLineUp(kind, pieces) && (
        <div className="mt-6">
          <SwapLineup
            kind={kind}
            pieces={pieces}
            surrounding={findSurrounding(kind, plan, answers[0]?.place)}
            printer={printer}
          />
        </div>
      )}
      {isNothing && (
        <div className="mt-6">
          <EmptyState
            title={`Nothing in the catalogue takes its place in this setup as it is described`}
            action={
              <Link to={reportHref} className={buttonClass()}>
                Look at what is assumed
              </Link>
            }
          >
            {failedBy[0]
              ? `Most are turned away for one reason: ${failedBy[0].count} are ${failedBy[0].label}. A second look with a tape often opens the list.`
              : counts.unknown > 0
                ? 'For all of them a number is missing that the verdict turns on.'
                : `Nobody has recorded any other ${getKind(kind).label} yet.`}
          </EmptyState>
        </div>
      )}
      <ol className="mt-4 border-t border-rule">
        {answers.slice(0, letters.length).map((answer, at) => (
          <CandidateCard
            key={answer.pieces.map(({ gear }) => gear?.slug).join(' ')}
            answer={answer}
            letter={letters[at] ?? ''}
            swap={swap}
          />
        ))}
      </ol>
      <p className="mt-4 flex flex-wrap gap-3 print:hidden">
        {visit.cursor !== null && (
          <Link to={writeSetupHref(paths.swap(gone.id), visit.visit.raw, system)} className={buttonClass()}>
            Back to the best three
          </Link>
        )}
        {next !== null && (
          <Link
            to={writeSetupHref(paths.swap(gone.id), visit.visit.raw, system, { cursor: next })}
            className={buttonClass()}
          >
            The next three
          </Link>
        )}
      </p>
      {failedBy.length > 0 && !isNothing && (
        <section className="mt-8">
          <h2>Why {counts.no} do not fit</h2>
          <ul className="mt-2 list-disc pl-5 text-sm">
            {failedBy.map(({ check, count, label }) => (
              <li key={check}>
                {count} {label}
              </li>
            ))}
          </ul>
        </section>
      )}
      <StandingCautions />
    </>
  )
}

/** What is gone beside what could take its place. */
export function SwapPage() {
  const swap = useSwap()
  const { found, unanswered, error, visit, printer } = swap
  if (found) return <Found swap={swap} found={found} />
  if (unanswered)
    return (
      <>
        <h1>There is nothing to replace here</h1>
        <div className="mt-6">
          <EmptyState
            title="This could not be answered"
            action={
              <Link
                to={writeSetupHref(paths.setup, visit.visit.raw, printer.system)}
                className={buttonClass({ variant: 'primary' })}
              >
                Open the setup
              </Link>
            }
          >
            {unanswered.refused.map(({ detail }) => detail).join(' ')} Your setup is kept in the address.
          </EmptyState>
        </div>
      </>
    )
  return (
    <>
      <h1>What replaces it?</h1>
      <div className="mt-6">
        {error ? (
          <ErrorState title="The candidates could not be fetched" onRetry={swap.retry}>
            Your setup is safe: it lives in the address of this page.
          </ErrorState>
        ) : (
          <LoadingBlock label="Loading candidates">
            <Skeleton className="h-72 w-full" />
            <Skeleton className="mt-4 h-40 w-full" />
          </LoadingBlock>
        )}
      </div>
    </>
  )
}
