import { useEffect } from 'react'
import { writeSetupLink } from '#shared/schemas/setup-link'
import type { UnitSystem } from '#shared/units/systems'
import type { RawSetup } from '../../../components/setup/edit-raw'

/** Long enough not to write with every letter. */
const restMs = 400

/**
 * Keeps what is typed in the address, without a step in the history: Back from the report, or a reload, brings it all
 * again. The page itself is not told: it has what was typed already.
 */
export function useKeptAddress(sent: RawSetup, texts: RawSetup, system: UnitSystem, chambers: number): void {
  useEffect(() => {
    if (texts === sent) return
    const { pathname } = window.location
    const keep = () => {
      // Sent meanwhile, the form has led somewhere else.
      if (window.location.pathname !== pathname) return
      const setup = writeSetupLink([...Object.entries(texts), ['typed', system]], system)
      const query = [setup, chambers > 1 && `chambers=${chambers}`].filter(Boolean).join('&')
      const address = `${pathname}${query && `?${query}`}${window.location.hash}`
      window.history.replaceState(window.history.state, '', address)
    }
    const timer = setTimeout(keep, restMs)
    return () => clearTimeout(timer)
  }, [sent, texts, system, chambers])
}
