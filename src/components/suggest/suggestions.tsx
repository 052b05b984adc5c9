import { useId, useMemo } from 'react'
import { keepPreviousData, useQuery } from '@tanstack/react-query'
import { useNavigate } from 'react-router-dom'
import { useApp } from '../../lib/app-context'
import { findSuggestions, type SuggestScope } from './find-suggestions'
import { brandsQuery, namedPiecesQuery } from './suggest-queries'
import { useCombobox } from './use-combobox'
import { useFieldText, useRested } from './use-field-text'

export interface SuggestionsProps {
  readonly field: HTMLInputElement
  /** What the field held when somebody turned to it: they may have typed on while this was fetched. */
  readonly before: string
  readonly scope: SuggestScope
}

const restMs = 180

/** A text that could name something: not yet a sentence. */
const couldName = (text: string): boolean => text.length >= 2 && text.length <= 40

function ask(field: HTMLInputElement, text: string): void {
  field.value = text
  field.form?.requestSubmit()
}

/** What the text in a field may mean, as a list under it. */
export default function Suggestions({ field, before, scope }: SuggestionsProps) {
  const { api } = useApp()
  const navigate = useNavigate()
  const id = useId()
  const text = useFieldText(field)
  const rested = useRested(text.trim(), restMs)
  const brands = useQuery(brandsQuery(api)).data
  const isNaming = couldName(rested)
  const { data: pieces } = useQuery({
    ...namedPiecesQuery(api, rested, scope.page === 'question' ? null : scope.kind),
    enabled: isNaming,
    placeholderData: keepPreviousData,
  })
  const { page, kind } = scope
  const suggestions = useMemo(
    () => findSuggestions(text, { page, kind }, brands ?? [], isNaming ? (pieces ?? []) : []),
    [text, page, kind, brands, pieces, isNaming],
  )
  const choose = (at: number) => {
    const chosen = suggestions[at]
    if (!chosen) return
    if ('href' in chosen) void navigate(chosen.href)
    else ask(field, chosen.text)
  }
  const optionId = (at: number) => `${id}-${at}`
  const { isOpen, active, setActive, close } = useCombobox({
    field,
    before,
    listId: `${id}-list`,
    count: suggestions.length,
    optionId,
    onChoose: choose,
  })
  return (
    <>
      <span role="status" className="sr-only">
        {isOpen && `${suggestions.length} suggestions, arrow down to choose`}
      </span>
      <ul
        id={`${id}-list`}
        role="listbox"
        aria-label="Suggestions"
        hidden={!isOpen}
        className="absolute top-full right-0 left-0 z-30 mt-1 max-h-80 overflow-y-auto rounded-ui border-[1.5px] border-ink bg-sheet py-1"
      >
        {suggestions.map((suggestion, at) => (
          <li
            key={suggestion.id}
            id={optionId(at)}
            role="option"
            aria-selected={at === active}
            // Focus stays in the field, or the list would close before it is pressed.
            onPointerDown={(event) => event.preventDefault()}
            onPointerMove={() => setActive(at)}
            onClick={() => {
              close()
              choose(at)
            }}
            className="flex min-h-9 cursor-pointer items-baseline justify-between gap-4 px-3 py-1.5 aria-selected:bg-action-soft"
          >
            <span className="min-w-0 break-words">{suggestion.label}</span>
            <span className="flex-none text-sm text-ink-soft">{suggestion.detail}</span>
          </li>
        ))}
      </ul>
    </>
  )
}
