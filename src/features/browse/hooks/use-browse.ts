import { useMemo } from 'react'
import { useLocation, useNavigate } from 'react-router-dom'
import type { Printer } from '#shared/units/print'
import { paths } from '../../../config/paths'
import { usePreferences } from '../../../lib/app-context'
import { usePrinter } from '../../../lib/use-printer'
import { writeBrowseState, type BrowseState } from '../link/browse-state'
import { readVisit, type Visit } from '../link/read-visit'
import type { TypingState } from './use-draft'

export interface Browse {
  readonly visit: Visit
  readonly state: BrowseState
  readonly printer: Printer
  readonly hrefOf: (change: Partial<BrowseState>) => string
  readonly go: (change: Partial<BrowseState>) => void
  /** Goes where the form would lead; what is being typed takes no step in the history. */
  readonly sendForm: (form: HTMLFormElement, isTyping?: boolean) => void
}

export const formId = 'gear-form'

export function toAddress(state: BrowseState): string {
  const query = writeBrowseState(state)
  return query === '' ? paths.gearList : `${paths.gearList}?${query}`
}

function readForm(form: HTMLFormElement): URLSearchParams {
  const texts = [...new FormData(form)].filter((entry): entry is [string, string] => typeof entry[1] === 'string')
  return new URLSearchParams(texts)
}

/** The page's state is its address; this reads it and changes it. */
export function useBrowse(): Browse {
  const { system } = usePreferences()
  const printer = usePrinter()
  const navigate = useNavigate()
  const { pathname, search } = useLocation()
  const visit = useMemo(() => readVisit(new URLSearchParams(search), system), [search, system])
  const { state } = visit
  const hrefOf = (change: Partial<BrowseState>) => toAddress({ ...state, ...change })
  return {
    visit,
    state,
    printer,
    hrefOf,
    go: (change) => void navigate(hrefOf(change), { preventScrollReset: true }),
    sendForm: (form, isTyping = false) => {
      const params = readForm(form)
      const { redirect, problems } = readVisit(params, system)
      const query = redirect ?? params.toString()
      if (isTyping && problems.some(({ end }) => end)) return
      const address = query === '' ? paths.gearList : `${paths.gearList}?${query}`
      if (address === `${pathname}${search}`) return
      const options = isTyping ? { replace: true, state: { isTyping } satisfies TypingState } : {}
      void navigate(address, { ...options, preventScrollReset: true })
    },
  }
}
