import { useState } from 'react'
import { findLinkField } from '#shared/schemas/setup-link'
import type { UnitSystem } from '#shared/units/systems'
import { spellOut, type RawSetup } from './edit-raw'

function spellAll(texts: RawSetup, system: UnitSystem): RawSetup {
  const known = new Map(Object.entries(texts))
  return Object.fromEntries(
    [...known].map(([path, text]) => {
      const attribute = findLinkField(path, known)
      return [path, attribute?.type === 'measure' && text.trim() !== '' ? spellOut(text, attribute, system) : text]
    }),
  )
}

/** What a form holds as it is typed. Bare numbers keep the unit they were typed in when the other system is switched to. */
export function useTypedTexts(initial: RawSetup, system: UnitSystem) {
  const [state, setState] = useState({ texts: initial, system })
  if (state.system !== system) setState({ texts: spellAll(state.texts, state.system), system })
  const onType = (path: string, text: string) =>
    setState((earlier) => ({ ...earlier, texts: { ...earlier.texts, [path]: text } }))
  return { texts: state.texts, onType }
}
