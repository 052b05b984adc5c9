import { useMemo } from 'react'
import { useQuery } from '@tanstack/react-query'
import { useLocation, useParams } from 'react-router-dom'
import type { Plan } from '#shared/engine/setup/plan'
import type { Turn } from '#shared/engine/types'
import type { GearCount, Replacement } from '#shared/engine/swap/types'
import type { Printer } from '#shared/units/print'
import type { ReplacementsAnswer } from '#shared/schemas/replacements'
import { findPlan } from '../../components/setup/find-plan'
import { gearEntryQuery } from '../../components/setup/gear-entry'
import { findTrial } from '../../components/setup/find-trial'
import { writeSetupHref } from '../../components/setup/setup-href'
import { paths } from '../../config/paths'
import { toEngineSetup } from '../../components/setup/to-engine-setup'
import { useApp, usePreferences } from '../../lib/app-context'
import { usePrinter } from '../../lib/use-printer'
import { writePutInHref } from './model/put-in'
import { readSwapVisit, type SwapVisit } from './read-swap-visit'
import { isRefused, type Refused } from '../../lib/problem'
import { replacementsQuery } from './replacements-query'

export interface Swap {
  readonly visit: SwapVisit
  readonly found: ReplacementsAnswer | null
  readonly unanswered: Refused | null
  readonly error: Error | null
  readonly retry: () => void
  readonly printer: Printer
  readonly plan: Plan
  readonly given: ReadonlySet<string>
  /** The same question in the setup with that number changed. */
  readonly tryHref: (turn: Turn) => string | undefined
  readonly putInHref: (
    answer: Replacement,
    extras: readonly { readonly need: string; readonly pieces: readonly GearCount[] }[],
  ) => string | null
}

/** What was found for another piece must not be put in this one's place while the page waits. */
const isFor = (answer: ReplacementsAnswer | Refused, itemId: string): boolean =>
  !isRefused(answer) && answer.gone.id === itemId

/** The swap page's state is its address; this reads it, and what was found for it. */
export function useSwap(): Swap {
  const { api } = useApp()
  const { system } = usePreferences()
  const printer = usePrinter()
  const { itemId = '' } = useParams()
  const { search } = useLocation()
  const visit = useMemo(() => readSwapVisit(new URLSearchParams(search), itemId, system), [search, itemId, system])
  const query = useQuery({
    ...replacementsQuery(api, visit.request),
    placeholderData: (before) => (before && isFor(before, itemId) ? before : undefined),
  })
  const { raw, setup } = visit.visit
  const slug = raw['tank.gear']
  const tank = useQuery({ ...gearEntryQuery(api, slug ?? ''), enabled: slug !== undefined }).data
  const { plan } = useMemo(() => findPlan(toEngineSetup(setup, tank)), [setup, tank])
  const answer = query.data
  return {
    visit,
    found: answer && !isRefused(answer) ? answer : null,
    unanswered: answer && isRefused(answer) ? answer : null,
    error: query.error,
    retry: () => void query.refetch(),
    printer,
    plan,
    given: new Set([...Object.keys(raw), ...Object.keys(tank?.specs ?? {}).map((key) => `tank.${key}`)]),
    tryHref: (turn) => {
      const changed = findTrial(turn, raw, printer)
      return changed && writeSetupHref(paths.swap(itemId), changed, system)
    },
    putInHref: (chosen, extras) => writePutInHref(raw, { itemId, answer: chosen, extras }, system),
  }
}
