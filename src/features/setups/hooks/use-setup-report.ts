import { useMemo } from 'react'
import { keepPreviousData, useQuery } from '@tanstack/react-query'
import { useLocation } from 'react-router-dom'
import type { Item, Report, Setup } from '#shared/engine/types'
import type { Plan } from '#shared/engine/setup/plan'
import { getKind } from '#shared/kinds/index'
import type { SetupParsed } from '#shared/schemas/setup'
import type { Printer } from '#shared/units/print'
import type { RawSetup } from '../../../components/setup/edit-raw'
import { findPlan } from '../../../components/setup/find-plan'
import { hasTankSize } from '../../../components/setup/has-tank-size'
import { readSetupVisit, type SetupVisit } from '../../../components/setup/read-setup-visit'
import { reportQuery } from '../../../components/setup/report-query'
import { isRefused, type Refused } from '../../../lib/problem'
import { writeSetupHref } from '../../../components/setup/setup-href'
import { toEngineSetup } from '../../../components/setup/to-engine-setup'
import { paths } from '../../../config/paths'
import { useApp, usePreferences } from '../../../lib/app-context'
import { usePrinter } from '../../../lib/use-printer'
import { useNamedItems } from './use-named-items'
import { capitalise } from '../../../lib/capitalise'

/** A report and what its page needs to draw, name and change the setup. */
export interface SetupReport {
  readonly visit: SetupVisit
  readonly report: Report
  readonly setup: Setup
  readonly plan: Plan
  /** Setup paths that the person, or the tank they named, gave. */
  readonly given: ReadonlySet<string>
  readonly printer: Printer
  readonly nameOf: (itemId: string) => string
  readonly hrefOf: (raw: RawSetup) => string
}

export interface ReportVisit {
  readonly visit: SetupVisit
  readonly shown: SetupReport | null
  readonly refused: Refused | null
  readonly error: Error | null
  readonly retry: () => void
}

/** Whether there is a whole setup to be judged: all of it could be read, and the tank has a size. */
export const canReport = ({ problems, setup }: SetupVisit): boolean => problems.length === 0 && hasTankSize(setup)

function toItems({ items }: Report, { setup }: SetupVisit): readonly Item[] {
  const asked = new Map(((setup as SetupParsed).items ?? []).map((item) => [item.id, item]))
  return items.map(({ id, kind, gear, specs, quantity }): Item => {
    const { place, mountHeightMm } = asked.get(id) ?? {}
    return {
      id,
      piece: { kind, specs, ...(gear && { gear }) },
      quantity,
      state: 'have',
      ...(place && { place }),
      ...(mountHeightMm !== undefined && { mountHeightMm }),
    }
  })
}

export function useSetupReport(): ReportVisit {
  const { api } = useApp()
  const { system } = usePreferences()
  const printer = usePrinter()
  const { search } = useLocation()
  const visit = useMemo(() => readSetupVisit(new URLSearchParams(search), system), [search, system])
  const query = useQuery({
    ...reportQuery(api, visit.setup),
    enabled: canReport(visit),
    placeholderData: keepPreviousData,
  })
  const named = useNamedItems(visit.raw)
  const answer = canReport(visit) ? query.data : undefined
  const refused = answer && isRefused(answer) ? answer : null
  const report = answer && !isRefused(answer) ? answer : null
  const base = { visit, refused, error: query.error, retry: () => void query.refetch() }
  if (!report) return { ...base, shown: null }
  const setup = toEngineSetup(visit.setup, named.tank, toItems(report, visit))
  const reported = new Map(report.items.map((item) => [item.id, item]))
  const nameOf = (id: string) => {
    if (id === 'tank') return named.tank ? `${named.tank.brand} · ${named.tank.model}` : 'The tank'
    const item = reported.get(id)
    if (!item) return named.of(id).name
    return item.gear ? `${item.gear.brand} · ${item.gear.model}` : capitalise(getKind(item.kind).label)
  }
  const given = new Set([
    ...Object.keys(visit.raw),
    ...Object.keys(named.tank?.specs ?? {}).map((key) => `tank.${key}`),
  ])
  const hrefOf = (raw: RawSetup) => writeSetupHref(paths.setup, raw, system)
  return { ...base, shown: { visit, report, setup, plan: findPlan(setup).plan, given, printer, nameOf, hrefOf } }
}
