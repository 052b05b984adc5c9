import { useMemo } from 'react'
import { keepPreviousData, useQuery } from '@tanstack/react-query'
import { useLocation, useParams } from 'react-router-dom'
import type { Plan } from '#shared/engine/setup/plan'
import type { GearCount, Replacement } from '#shared/engine/swap/types'
import type { Printer } from '#shared/units/print'
import type { ReplacementsAnswer } from '#shared/schemas/replacements'
import { findPlan } from '../../components/setup/find-plan'
import { gearEntryQuery } from '../../components/setup/gear-entry'
import { toEngineSetup } from '../../components/setup/to-engine-setup'
import { useApp, usePreferences } from '../../lib/app-context'
import { usePrinter } from '../../lib/use-printer'
import { writePutInHref } from './model/put-in'
import { readSwapVisit, type SwapVisit } from './read-swap-visit'
import { isUnanswered, replacementsQuery, type Unanswered } from './replacements-query'

export interface Swap {
  readonly visit: SwapVisit
  readonly found: ReplacementsAnswer | null
  readonly unanswered: Unanswered | null
  readonly error: Error | null
  readonly retry: () => void
  readonly printer: Printer
  readonly plan: Plan
  readonly given: ReadonlySet<string>
  readonly putInHref: (
    answer: Replacement,
    extras: readonly { readonly need: string; readonly pieces: readonly GearCount[] }[],
  ) => string | null
}

/** The swap page's state is its address; this reads it, and what was found for it. */
export function useSwap(): Swap {
  const { api } = useApp()
  const { system } = usePreferences()
  const printer = usePrinter()
  const { itemId = '' } = useParams()
  const { search } = useLocation()
  const visit = useMemo(() => readSwapVisit(new URLSearchParams(search), itemId, system), [search, itemId, system])
  const query = useQuery({ ...replacementsQuery(api, visit.request), placeholderData: keepPreviousData })
  const { raw, setup } = visit.visit
  const slug = raw['tank.gear']
  const tank = useQuery({ ...gearEntryQuery(api, slug ?? ''), enabled: slug !== undefined }).data
  const { plan } = useMemo(() => findPlan(toEngineSetup(setup, tank)), [setup, tank])
  const answer = query.data
  return {
    visit,
    found: answer && !isUnanswered(answer) ? answer : null,
    unanswered: answer && isUnanswered(answer) ? answer : null,
    error: query.error,
    retry: () => void query.refetch(),
    printer,
    plan,
    given: new Set([...Object.keys(raw), ...Object.keys(tank?.specs ?? {}).map((key) => `tank.${key}`)]),
    putInHref: (chosen, extras) => writePutInHref(raw, { itemId, answer: chosen, extras }, system),
  }
}
