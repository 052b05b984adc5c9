import { Link } from 'react-router-dom'
import type { FitAnswer } from '#shared/schemas/answer'
import { getKind } from '#shared/kinds/index'
import { CautionBox } from '../../../components/ui/caution-box'
import { EmptyState } from '../../../components/ui/empty-state'
import type { Answers } from '../hooks/use-answers'
import type { Finder } from '../hooks/use-finder'
import type { Opened } from '../link/finder-state'
import { findSharedCautions } from '../model/shared-cautions'
import { AnswerList } from './answer-list'
import { GroupHeading } from './group-heading'
import { ReasonChips, type Reason } from './reason-chips'

export interface AnswerGroupsProps {
  readonly finder: Finder
  readonly fits: Answers
  readonly changes: Answers
  readonly openedList: Answers
  readonly lit: string | null
  readonly onPoint: (slug: string | null) => void
}

const groupClass = 'border-t border-ink pt-3'

function listReasons(finder: Finder, first: FitAnswer, verdict: Opened['verdict']): readonly Reason[] {
  const { state, hrefOf } = finder
  const total = first.counts[verdict]
  const open = (narrow: Pick<Opened, 'check' | 'missing'>) => {
    const { check, missing } = state.opened?.verdict === verdict ? state.opened : { check: null, missing: null }
    const isOpen = check === narrow.check && missing === narrow.missing
    return { isOpen, href: hrefOf({ opened: isOpen ? null : { verdict, ...narrow } }) }
  }
  const all = { key: 'all', count: total, label: 'all of them', ...open({}) }
  if (verdict === 'unknown') {
    const reasons = first.missingBy.map(({ key, count, label }) => ({
      key,
      count,
      label: `without a recorded ${label}`,
      ...open({ missing: key }),
    }))
    return reasons.length > 1 ? [...reasons, all] : reasons
  }
  const reasons = first.failedBy.map(({ check, count, label }) => ({
    key: check,
    count,
    label,
    ...open({ check }),
  }))
  return total > 0 ? [...reasons, all] : reasons
}

/** What to say less strictly where nothing fits: what turned most pieces away. */
function Nothing({ finder, first }: { readonly finder: Finder; readonly first: FitAnswer }) {
  const { plural } = getKind(finder.state.kind)
  const { counts, failedBy } = first
  const all = counts.no + counts.unknown
  const { wishes, kind } = finder.state
  if (all === 0 && Object.keys(wishes).length > 0)
    return (
      <EmptyState title={`No ${getKind(kind).label} on record is like that`}>
        What nobody has recorded of a piece counts as not so. Let go of a wish above, or of{' '}
        <Link to={finder.hrefOf({ wishes: {} })} preventScrollReset className="link">
          all of them
        </Link>
        , and the other {plural} come back.
      </EmptyState>
    )
  if (all === 0)
    return (
      <EmptyState title={`No ${plural} are recorded yet`}>
        Nobody has added any to the catalogue. Another kind can be chosen in the heading.
      </EmptyState>
    )
  const [worst] = failedBy
  return (
    <EmptyState title={`None of the ${all} ${plural} fits this setup as it is drawn`}>
      {worst
        ? `Most are turned away for one reason: ${worst.count} are ${worst.label}. Check the measure behind it in the drawing and among what is assumed; a second look with a tape often opens the list.`
        : 'For all of them a number is missing that the verdict turns on.'}
    </EmptyState>
  )
}

/** The answers in four groups, the best first; what does not fit is counted by reason and opens. */
export function AnswerGroups({ finder, fits, changes, openedList, lit, onPoint }: AnswerGroupsProps) {
  const { first } = fits
  const { opened } = finder.state
  const saidAbove = findSharedCautions([...fits.answers, ...changes.answers])
  const shared = { finder, lit, saidAbove, onPoint }
  const isNothing = first !== undefined && first.counts.fits + first.counts.changes === 0
  return (
    <div className="mt-10 space-y-10">
      {saidAbove.length > 0 && <CautionBox title="For every answer that fits:">{saidAbove.join(' ')}</CautionBox>}
      {first && isNothing && <Nothing finder={finder} first={first} />}
      {!isNothing && (
        <section className={groupClass}>
          <GroupHeading verdict="fits" count={first?.counts.fits} />
          {first?.counts.fits === 0 && (
            <p className="mt-2 text-ink-soft">None as the setup stands; see what fits with changes.</p>
          )}
          <AnswerList verdict="fits" list={fits} {...shared} />
        </section>
      )}
      {!isNothing && first?.counts.changes !== 0 && (
        <section className={groupClass}>
          <GroupHeading verdict="changes" count={first?.counts.changes} />
          <AnswerList verdict="changes" list={changes} {...shared} />
        </section>
      )}
      {first &&
        (['no', 'unknown'] as const).map(
          (verdict) =>
            first.counts[verdict] > 0 && (
              <section key={verdict} id={`group-${verdict}`} className={groupClass}>
                <GroupHeading verdict={verdict} count={first.counts[verdict]} />
                <ReasonChips
                  reasons={listReasons(finder, first, verdict)}
                  tone={verdict === 'no' ? 'text-no' : 'text-unknown'}
                />
                {verdict === 'unknown' && (
                  <p className="mt-2 max-w-prose text-sm text-ink-soft">
                    A missing number is never guessed. Have one of these at hand? Open the list and see which number to
                    measure.
                  </p>
                )}
                {opened?.verdict === verdict && (
                  <div className="mt-3">
                    <AnswerList verdict={verdict} list={openedList} {...shared} />
                  </div>
                )}
              </section>
            ),
        )}
    </div>
  )
}
