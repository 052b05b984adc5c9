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
    const keep = () => {
      const query = new URLSearchParams(writeSetupLink([...Object.entries(texts), ['typed', system]], system))
      if (chambers > 1) query.set('chambers', String(chambers))
      const { pathname, hash } = window.location
      const search = query.size === 0 ? '' : `?${query.toString()}`
      window.history.replaceState(window.history.state, '', `${pathname}${search}${hash}`)
    }
    const timer = setTimeout(keep, restMs)
    return () => clearTimeout(timer)
  }, [sent, texts, system, chambers])
}
