import clsx from 'clsx'
import { Link } from 'react-router-dom'
import type { Answer } from '#shared/engine/types'
import { VerdictIcon } from '../../../components/ui/verdict-icon'
import { describeSpecs } from '../../../lib/describe-specs'
import { verdictTextClasses, verdictWords } from '../../../lib/verdicts'
import type { Finder } from '../hooks/use-finder'
import { CautionList } from '../../../components/setup/caution-list'
import { findDecidingCheck } from '../../../components/setup/deciding-check'
import { CheckList } from '../../../components/setup/check-list'
import { writeWorkingHref } from '../../../components/setup/working-href'
import { DecidingGauge } from '../../../components/setup/deciding-gauge'
import { findTrial } from '../../../components/setup/find-trial'
import { PieceNames } from '../../../components/setup/piece-names'
import { LazyAnswerDrawing } from '../../../components/setup/lazy-answer-drawing'
import { TurnLine } from '../../../components/setup/turn-line'

export interface AnswerCardProps {
  readonly answer: Answer
  readonly finder: Finder
  readonly isLit: boolean
  readonly isPicked: boolean
  /** Cautions that were said above for all. */
  readonly saidAbove?: readonly string[]
  readonly onPoint?: (slug: string | null) => void
}

const bareSpecs = ({ specs }: Answer): Record<string, unknown> =>
  Object.fromEntries(Object.entries(specs).map(([key, value]) => [key, value?.value]))

function countKnockOns(count: number): string {
  if (count === 0) return 'Nothing else changes'
  return count === 1 ? '1 knock-on' : `${count} knock-ons`
}

/** One piece with its verdict, the sentence, what else changes, and every check behind it. */
export function AnswerCard({ answer, finder, isLit, isPicked, saidAbove = [], onPoint }: AnswerCardProps) {
  const { gear, verdict, summary, checks, knockOns, kind, pieces, confidence, turnsBy } = answer
  const quantity = pieces[0]?.quantity ?? 1
  const { printer, plan, given, hrefOf, state } = finder
  const deciding = findDecidingCheck(checks)
  const cautions = answer.cautions.filter((caution) => !saidAbove.includes(caution))
  const slug = gear?.slug ?? null
  const trial = turnsBy && findTrial(turnsBy, state.raw, printer)
  return (
    <li
      id={slug === null ? undefined : `answer-${slug}`}
      data-lit={isLit || undefined}
      onPointerEnter={() => onPoint?.(slug)}
      onPointerLeave={() => onPoint?.(null)}
      className={clsx(
        'border-b border-rule border-l-[3px] py-4 pl-3',
        isLit ? 'border-l-action bg-sheet' : 'border-l-transparent',
      )}
    >
      <article className="grid grid-cols-[1.75rem_minmax(0,1fr)] gap-x-3 gap-y-3 md:grid-cols-[1.75rem_minmax(0,5fr)_minmax(0,4fr)_12rem] md:gap-x-5">
        <VerdictIcon verdict={verdict} size={28} />
        <div className="min-w-0">
          <h4 className="font-heading text-lg leading-snug font-bold">
            <PieceNames pieces={pieces} />
          </h4>
          {pieces.length === 1 && (
            <p className="text-sm text-ink-soft">{describeSpecs(kind, bareSpecs(answer), printer)}</p>
          )}
          <p className="mt-1">{summary}</p>
          {turnsBy && <TurnLine turn={turnsBy} href={trial && hrefOf({ raw: trial, picked: slug })} />}
          <p className="mt-1 flex flex-wrap gap-x-4 text-sm text-ink-soft">
            <span className={`font-semibold ${verdictTextClasses[verdict]}`}>{verdictWords[verdict]}</span>
            {confidence.closeCalls > 0 && (
              <span className="font-semibold text-changes">
                {confidence.closeCalls === 1 ? 'a close call' : `${confidence.closeCalls} close calls`}
              </span>
            )}
            <span>
              {confidence.level === 'mixed' ? 'numbers from several sources' : `numbers: ${confidence.level}`}
            </span>
            {slug !== null && (
              <Link
                to={hrefOf({ picked: isPicked ? null : slug })}
                replace
                preventScrollReset
                className="link print:hidden"
              >
                {isPicked ? 'drawn above' : 'show in the drawing'}
              </Link>
            )}
          </p>
        </div>
        <div className="col-start-2 min-w-0 text-sm md:col-start-auto">
          {verdict !== 'no' && (
            <p className={`font-semibold ${knockOns.length === 0 ? 'text-fits' : 'text-changes'}`}>
              {countKnockOns(knockOns.length)}
            </p>
          )}
          {knockOns.length > 0 && (
            <ul className="list-disc space-y-0.5 pl-4">
              {knockOns.map(({ message, subject }) => (
                <li key={`${subject}${message}`}>{message}</li>
              ))}
            </ul>
          )}
          <CautionList cautions={cautions} />
        </div>
        <div className="col-start-2 min-w-0 md:col-start-auto">
          {deciding && <DecidingGauge check={deciding} printer={printer} />}
        </div>
      </article>
      <div className="mt-2 ml-10">
        <CheckList
          checks={checks}
          plan={plan}
          printer={printer}
          drawing={<LazyAnswerDrawing answer={answer} plan={plan} given={given} printer={printer} />}
          workingHrefOf={(check) =>
            slug === null ? undefined : writeWorkingHref(check, state.raw, printer.system, { piece: slug, quantity })
          }
        />
      </div>
    </li>
  )
}
