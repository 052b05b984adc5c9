import { useState } from 'react'
import { useQuery } from '@tanstack/react-query'
import { getKind } from '#shared/kinds/index'
import { Disclosure } from '../../../components/ui/disclosure'
import { LiveStatus } from '../../../components/ui/live-status'
import { Popover } from '../../../components/ui/popover'
import { useApp } from '../../../lib/app-context'
import { fitCheckQuery } from '../api/fit-check'
import { canAsk } from '../api/requests'
import { useAnswers, type Answers } from '../hooks/use-answers'
import { useFinder } from '../hooks/use-finder'
import { StandingCautions } from '../../../components/setup/standing-cautions'
import { findEditTarget } from '../../../components/setup/edit-target'
import { toRod } from '../../../components/setup/to-drawing'
import { AnswerGroups } from './answer-groups'
import { AnswersFailed } from './answer-list'
import { EditFields } from '../../../components/setup/edit-fields'
import { HiddenFields } from './hidden-fields'
import { KindHeading } from './kind-heading'
import { PlainForm, ProblemSummary } from './plain-form'
import { QuestionBox } from './question-box'
import { ReadingChips } from './reading-chips'
import { RefusalNotice } from './refusal-notice'
import { Scales } from './scales'
import { SetupValues } from './setup-values'
import { TankForm } from './tank-form'
import { WishChips } from './wish-chips'

interface Editing {
  readonly path: string
  readonly anchor: Element
}

function announce({ first, isStale, isPending }: Answers): string {
  if (isPending || isStale || !first) return ''
  const { fits, changes, no, unknown } = first.counts
  return `${fits} fit, ${changes} with changes, ${no} do not fit, ${unknown} lack data.`
}

/** The finder: a question, the drawn tank that is the form, and the answers under it. */
export function Finder() {
  const { api } = useApp()
  const finder = useFinder()
  const { visit, state, printer, plan, isExample } = finder
  const [editing, setEditing] = useState<Editing | null>(null)
  const [pointed, setPointed] = useState<string | null>(null)
  const fits = useAnswers(visit, 'fits')
  const changes = useAnswers(visit, 'changes')
  const openedList = useAnswers(visit, state.opened?.verdict ?? 'no', state.opened !== null)
  const picked = useQuery({
    ...fitCheckQuery(api, visit.setup, state.picked ?? ''),
    enabled: state.picked !== null && canAsk(visit),
  }).data

  const listed = [...fits.answers, ...changes.answers, ...(state.opened ? openedList.answers : [])]
  const findListed = (slug: string | null) => listed.find(({ gear }) => gear?.slug === slug)
  const chosen = findListed(state.picked) ?? picked ?? null
  const isPickedListed = findListed(state.picked) !== undefined
  const drawn = (pointed === null ? undefined : findListed(pointed)) ?? chosen ?? listed[0]
  const rod = drawn && toRod(drawn, plan)
  const telling = new Set(listed.flatMap(({ checks }) => checks.flatMap(({ assumed = [] }) => assumed)))

  const target = editing && findEditTarget(editing.path, plan)
  const edit = (path: string, anchor: Element) => setEditing({ path, anchor })
  const { first, refusal } = fits
  return (
    <>
      <LiveStatus message={announce(fits)} />
      <KindHeading state={state} />
      <div className="mt-4">
        <QuestionBox
          asked={state.asked}
          example="heater for a 20 gallon with a 4 x 5 x 12 inch rear chamber, room gets down to 60 F"
        >
          <HiddenFields state={state} without={['asked', 'wishes']} />
        </QuestionBox>
      </div>
      <ReadingChips finder={finder} onEdit={edit} />
      <WishChips finder={finder} />
      <div className="mt-4 space-y-4">
        <ProblemSummary finder={finder} />
        {refusal && <RefusalNotice refusal={refusal} finder={finder} />}
      </div>
      <div className="mt-6 grid gap-x-8 gap-y-8 lg:grid-cols-[minmax(0,1fr)_19rem]">
        <TankForm finder={finder} rod={rod} onEdit={edit} />
        <aside aria-label="The setup in words" className="lg:border-l lg:border-dashed lg:border-ink-soft lg:pl-6">
          <SetupValues finder={finder} telling={telling} onEdit={edit} />
        </aside>
      </div>
      <div className="mt-6 print:hidden">
        <Disclosure summary="Every measure as a plain form" isOpen={visit.problems.length > 0}>
          <PlainForm key={`${JSON.stringify(state.raw)}${state.kind}`} finder={finder} />
        </Disclosure>
      </div>
      {first && (
        <Scales
          finder={finder}
          first={first}
          apart={isPickedListed ? null : chosen}
          pointed={pointed}
          onPoint={setPointed}
        />
      )}
      {!isExample && !refusal && (
        <section aria-label={`Answers: ${getKind(state.kind).plural}`}>
          {fits.error && !first ? (
            <div className="mt-10">
              <AnswersFailed list={fits} />
            </div>
          ) : (
            <AnswerGroups
              finder={finder}
              fits={fits}
              changes={changes}
              openedList={openedList}
              lit={pointed ?? state.picked}
              onPoint={setPointed}
            />
          )}
        </section>
      )}
      <StandingCautions />
      {target && (
        <Popover anchor={editing.anchor} onClose={() => setEditing(null)} label={target.title}>
          <EditFields
            key={editing.path}
            raw={state.raw}
            plan={plan}
            printer={printer}
            target={target}
            onChange={(raw) => finder.go({ raw })}
            onDone={() => setEditing(null)}
          />
        </Popover>
      )}
      {/* Printed or read aloud, a page says in whose units it speaks. */}
      <p className="sr-only">
        Measures are in {printer.system === 'us' ? 'inches, gallons and °F' : 'millimetres, litres and °C'}.
      </p>
    </>
  )
}
