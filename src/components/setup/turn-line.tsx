import { Link } from 'react-router-dom'
import type { Turn } from '#shared/engine/types'

export interface TurnLineProps {
  readonly turn: Turn
  /** Where the setup has that number; without it there is nothing to try. */
  readonly href?: string | undefined
}

/** "It would fit if the rear chamber were 12 mm longer", and a way to see the setup like that. */
export function TurnLine({ turn, href }: TurnLineProps) {
  return (
    <p className="mt-1">
      {turn.message}
      {href !== undefined && (
        <>
          {' '}
          <Link to={href} preventScrollReset className="link print:hidden">
            Try it
          </Link>
        </>
      )}
    </p>
  )
}
