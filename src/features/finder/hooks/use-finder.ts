import { useMemo } from 'react'
import { useQuery } from '@tanstack/react-query'
import { useLocation, useNavigate } from 'react-router-dom'
import type { Plan } from '#shared/engine/setup/plan'
import type { Printer } from '#shared/units/print'
import { paths } from '../../../config/paths'
import { useApp, usePreferences } from '../../../lib/app-context'
import { usePrinter } from '../../../lib/use-printer'
import { gearEntryQuery } from '../../../components/setup/gear-entry'
import { writeFinderState, type FinderState } from '../link/finder-state'
import { readVisit, type Visit } from '../link/read-visit'
import { findPlan } from '../../../components/setup/find-plan'
import { toEngineSetup } from '../../../components/setup/to-engine-setup'

export interface Finder {
  readonly visit: Visit
  readonly state: FinderState
  readonly printer: Printer
  readonly plan: Plan
  /** The drawing shows an example: nothing is said of the tank yet. */
  readonly isExample: boolean
  /** Setup paths that the person, or the tank they named, gave. */
  readonly given: ReadonlySet<string>
  readonly hrefOf: (change: Partial<FinderState>) => string
  /** Goes to the changed state; what only lights something up takes no step in the history. */
  readonly go: (change: Partial<FinderState>, isGlance?: boolean) => void
}

function listGiven({ state, problems }: Visit, specs: object): ReadonlySet<string> {
  const wrong = new Set(problems.map(({ path }) => path))
  const own = Object.keys(state.raw).filter((path) => !wrong.has(path))
  return new Set([...own, ...Object.keys(specs).map((key) => `tank.${key}`)])
}

/** The finder's state is its address; this reads it and changes it. */
export function useFinder(): Finder {
  const { api } = useApp()
  const { system } = usePreferences()
  const printer = usePrinter()
  const navigate = useNavigate()
  const { search } = useLocation()
  const visit = useMemo(() => readVisit(new URLSearchParams(search), system), [search, system])
  const { state, setup } = visit
  const slug = state.raw['tank.gear']
  const tank = useQuery({ ...gearEntryQuery(api, slug ?? ''), enabled: slug !== undefined }).data
  const drawn = useMemo(() => findPlan(toEngineSetup(setup, tank)), [setup, tank])
  const given = useMemo(() => listGiven(visit, tank?.specs ?? {}), [visit, tank])

  const hrefOf = (change: Partial<FinderState>) => {
    // Another kind has other attributes to wish for.
    const wishes = change.kind === undefined || change.kind === state.kind ? state.wishes : {}
    return `${paths.find}?${writeFinderState({ ...state, wishes, from: null, ...change }, system)}`
  }
  return {
    visit,
    state,
    printer,
    given,
    ...drawn,
    hrefOf,
    go: (change, isGlance = false) => void navigate(hrefOf(change), { replace: isGlance, preventScrollReset: true }),
  }
}
