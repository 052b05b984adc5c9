import { useDeferredValue, useEffect, useMemo, useState } from 'react'
import { useLocation, useNavigate } from 'react-router-dom'
import type { Worksheet } from '#shared/engine/worksheets/types'
import type { Printer } from '#shared/units/print'
import { paths } from '../../../config/paths'
import { usePrinter } from '../../../lib/use-printer'
import { readVisit } from '../link/read-visit'
import { readSheet, type SheetTexts } from '../link/read-sheet'
import { spellBareNumbers, spellTyped } from '../link/spell-values'
import { solveSheet, type Solved } from '../model/solve-sheet'
import { writeExample } from '../model/write-example'

export interface Sheet {
  readonly sheet: Worksheet
  readonly printer: Printer
  readonly texts: SheetTexts
  readonly solved: Solved
  /** Nobody's numbers: shown until the first is typed. */
  readonly isExample: boolean
  /** Changed since the form was sent or its address opened. */
  readonly isTyping: boolean
  readonly onType: (path: string, text: string) => void
  /** The form is sent: what is wrong is now said in one place too. */
  readonly onSend: () => void
}

/** Long enough to finish a number, short enough that the address is right when it is copied. */
const settleMs = 700

function readTexts(sheet: Worksheet, search: string, printer: Printer) {
  const { read, isEmpty, isCleared } = readVisit(sheet, new URLSearchParams(search), printer.system)
  const isExample = isEmpty && !isCleared
  return { texts: isExample ? writeExample(sheet, printer) : spellBareNumbers(sheet, read.texts, printer), isExample }
}

/** A worksheet's inputs live in its address; while they are typed the result follows at once and the address after. */
export function useSheet(sheet: Worksheet): Sheet {
  const printer = usePrinter()
  const navigate = useNavigate()
  const { search } = useLocation()
  const [state, setState] = useState(() => ({
    search,
    ...readTexts(sheet, search, printer),
    isTyping: false,
    hasTyped: false,
    typedIn: printer.system,
  }))
  // Switched to the other system, what was typed keeps its unit; the example is anybody's, and is told anew.
  if (state.typedIn !== printer.system) {
    const texts = state.isExample ? writeExample(sheet, printer) : spellTyped(sheet, state.texts, state.typedIn)
    setState({ ...state, texts, typedIn: printer.system })
  }
  const shown = useDeferredValue(state.texts)
  const solved = useMemo(() => solveSheet(sheet, shown, printer), [sheet, shown, printer])
  const typedQuery = useMemo(() => {
    const { system } = printer
    return readSheet(sheet, Object.entries(state.texts), system, system).query
  }, [sheet, state.texts, printer])

  // An address that somebody else wrote, such as the browser's way back, brings its own inputs.
  if (state.search !== search) {
    const isOurs = search === (typedQuery === '' ? '?clear=yes' : `?${typedQuery}`)
    const next = isOurs ? state : { ...state, ...readTexts(sheet, search, printer), hasTyped: false }
    setState({ ...next, search, isTyping: false })
  }

  useEffect(() => {
    if (!state.isTyping) return
    const query = typedQuery === '' ? 'clear=yes' : typedQuery
    const timer = setTimeout(
      () => void navigate(`${paths.worksheet(sheet.name)}?${query}`, { replace: true, preventScrollReset: true }),
      settleMs,
    )
    return () => clearTimeout(timer)
  }, [navigate, sheet.name, state.isTyping, typedQuery])

  return {
    sheet,
    printer,
    texts: state.texts,
    solved,
    isExample: state.isExample,
    isTyping: state.hasTyped,
    onSend: () => setState((earlier) => ({ ...earlier, hasTyped: false })),
    onType: (path, text) =>
      setState((earlier) => ({
        ...earlier,
        texts: { ...earlier.texts, [path]: text },
        isExample: false,
        isTyping: true,
        hasTyped: true,
      })),
  }
}
