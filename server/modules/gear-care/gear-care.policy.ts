import type { GearCare } from '#shared/schemas/review'
import { isModerator, type Actor } from '../../lib/actor'

export interface PieceState {
  readonly mergedInto: number | null
  readonly retiredAt: Date | null
}

export function nameState({ mergedInto, retiredAt }: PieceState): GearCare['state'] {
  if (retiredAt !== null) return 'retired'
  return mergedInto === null ? 'live' : 'merged'
}

/** What a reader may do with a piece. */
export function listCareRights(actor: Actor, piece: PieceState): GearCare['can'] {
  const isActive = actor.isConfirmed && !actor.isSuspended
  const mayCare = isActive && isModerator(actor)
  const state = nameState(piece)
  return {
    propose: isActive && state === 'live',
    confirm: isActive && state === 'live',
    restore: mayCare && state === 'live',
    merge: mayCare && state === 'live',
    unmerge: mayCare && state === 'merged',
    retire: mayCare && state === 'live',
    unretire: mayCare && state === 'retired',
  }
}
