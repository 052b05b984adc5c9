import { useEffect, useEffectEvent, useState } from 'react'

interface Combobox {
  readonly isOpen: boolean
  readonly active: number
  readonly setActive: (at: number) => void
  readonly close: () => void
}

export interface ComboboxOptions {
  readonly field: HTMLInputElement
  /** A field that holds something else by now is being typed in. */
  readonly before: string
  readonly listId: string
  readonly count: number
  readonly optionId: (at: number) => string
  readonly onChoose: (at: number) => void
}

const none = -1

/**
 * Makes a text field the editable combobox of the WAI-ARIA Authoring Practices (list autocomplete, manual selection):
 * focus stays in the field, arrows walk the options, Enter takes the active one or sends the form as ever, Escape closes.
 */
export function useCombobox({ field, before, listId, count, optionId, onChoose }: ComboboxOptions): Combobox {
  const [isWanted, setIsWanted] = useState(() => field.value !== before && field === document.activeElement)
  const [active, setActive] = useState(none)
  const isOpen = isWanted && count > 0
  const shown = isOpen && active < count ? active : none

  const onKey = useEffectEvent((event: KeyboardEvent) => {
    const { key, isComposing } = event
    if (isComposing) return
    if ((key === 'ArrowDown' || key === 'ArrowUp') && count > 0) {
      event.preventDefault()
      setIsWanted(true)
      const step = key === 'ArrowDown' ? 1 : -1
      const from = shown === none && step < 0 ? count : shown
      const next = from + step
      setActive(next >= count || next < 0 ? none : next)
    } else if (key === 'Enter' && shown !== none) {
      event.preventDefault()
      setIsWanted(false)
      onChoose(shown)
    } else if (key === 'Escape' && isOpen) {
      event.preventDefault()
      setIsWanted(false)
      setActive(none)
    } else if (key === 'Enter') setIsWanted(false)
  })

  useEffect(() => {
    const open = () => {
      setIsWanted(true)
      setActive(none)
    }
    const close = () => setIsWanted(false)
    const press = (event: KeyboardEvent) => onKey(event)
    field.addEventListener('input', open)
    field.addEventListener('blur', close)
    field.addEventListener('keydown', press)
    return () => {
      field.removeEventListener('input', open)
      field.removeEventListener('blur', close)
      field.removeEventListener('keydown', press)
    }
  }, [field])

  const activeId = shown === none ? null : optionId(shown)
  useEffect(() => {
    field.setAttribute('role', 'combobox')
    field.setAttribute('aria-autocomplete', 'list')
    field.setAttribute('aria-expanded', String(isOpen))
    field.setAttribute('aria-controls', listId)
    if (activeId === null) field.removeAttribute('aria-activedescendant')
    else {
      field.setAttribute('aria-activedescendant', activeId)
      document.getElementById(activeId)?.scrollIntoView({ block: 'nearest' })
    }
  }, [field, isOpen, listId, activeId])

  return { isOpen, active: shown, setActive, close: () => setIsWanted(false) }
}
