import { Link } from 'react-router-dom'
import type { Replacement } from '#shared/engine/swap/types'
import { CautionList } from '../../../components/setup/caution-list'
import { CheckList } from '../../../components/setup/check-list'
import { DecidingGauge } from '../../../components/setup/deciding-gauge'
import { findDecidingCheck } from '../../../components/setup/deciding-check'
import { PieceNames } from '../../../components/setup/piece-names'
import { TurnLine } from '../../../components/setup/turn-line'
import { LazyAnswerDrawing } from '../../../components/setup/lazy-answer-drawing'
import { VerdictBadge } from '../../../components/ui/verdict-badge'
import { buttonClass } from '../../../components/ui/button-class'
import { describeSpecs } from '../../../lib/describe-specs'
import type { Swap } from '../use-swap'
import { AddOnList } from './add-on-list'
import { DifferenceList } from './difference-list'

export interface CandidateCardProps {
  readonly answer: Replacement
  readonly letter: string
  readonly swap: Swap
}

/** One candidate: its verdict, what else would change, what it needs besides, and how it differs from what is gone. */
export function CandidateCard({ answer, letter, swap }: CandidateCardProps) {
  const { gear, kind, specs, verdict, summary, knockOns, cautions, checks, pieces, differences, turnsBy } = answer
  const { printer, plan, given } = swap
  const deciding = findDecidingCheck(checks)
  const bare = Object.fromEntries(Object.entries(specs).map(([key, value]) => [key, value?.value]))
  const href = swap.putInHref(answer, [])
  const isSeveral = pieces.length > 1
  // What does not fit is not followed any further: it cannot be said to change nothing.
  const isFollowed = knockOns.length > 0 || verdict !== 'no'
  return (
    <li className="border-b border-rule py-6">
      <article className="grid gap-x-6 gap-y-4 md:grid-cols-[2rem_minmax(0,1fr)_13rem]">
        <p aria-hidden="true" className="font-mono text-2xl font-bold">
          {letter}
        </p>
        <div className="min-w-0">
          <h3 className="font-heading text-lg leading-snug font-bold">
            <span className="sr-only">{letter}: </span>
            <PieceNames pieces={pieces} />
          </h3>
          {!isSeveral && <p className="text-sm text-ink-soft">{describeSpecs(kind, bare, printer)}</p>}
          <p className="mt-1">
            <VerdictBadge verdict={verdict} />
          </p>
          <p className="mt-1">{summary}</p>
          {turnsBy && <TurnLine turn={turnsBy} href={swap.tryHref(turnsBy)} />}
          {isFollowed && (
            <h4 className="mt-3 text-sm font-semibold">
              {knockOns.length === 0 ? 'Nothing else changes' : 'What else would change'}
            </h4>
          )}
          {knockOns.length > 0 && (
            <ul className="list-disc space-y-0.5 pl-5 text-sm">
              {knockOns.map(({ message, subject, kind: sort }) => (
                <li key={`${subject}${message}`} className={sort === 'freed' ? 'text-fits' : undefined}>
                  {message}
                </li>
              ))}
            </ul>
          )}
          <AddOnList answer={answer} swap={swap} />
          <CautionList cautions={cautions} />
        </div>
        <div className="flex min-w-0 flex-col items-start gap-3">
          {deciding && (
            <div className="w-full">
              <DecidingGauge check={deciding} printer={printer} />
            </div>
          )}
          {href !== null && (
            <Link
              to={href}
              aria-label={['Put this one in', gear && `${gear.brand} ${gear.model}`].filter(Boolean).join(': ')}
              className={`print:hidden ${buttonClass({ variant: 'primary' })}`}
            >
              Put this one in
            </Link>
          )}
        </div>
        <div className="min-w-0 md:col-start-2 md:col-end-4">
          <h4 className="mb-2 text-sm font-semibold">Beside what is gone</h4>
          <DifferenceList differences={differences} />
        </div>
      </article>
      <div className="mt-3 print:hidden">
        <CheckList
          checks={checks}
          plan={plan}
          printer={printer}
          drawing={<LazyAnswerDrawing answer={answer} plan={plan} given={given} printer={printer} />}
        />
      </div>
    </li>
  )
}
