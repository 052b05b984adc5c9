import type { Item, Place, Source } from '../types'
import type { Chamber, Plan } from './plan'

/** A body of water that a rod or body can be put in: a chamber, the sump, or the display itself. Inside measures, mm. */
export interface Basin extends Chamber {
  /** Setup path of its sizes, for assumptions and for questions about it. */
  readonly path: string
  readonly source: Source
  readonly plusMinus?: number
}

const toBasin = (plan: Plan, chamber: Chamber, path: string): Basin => ({
  ...chamber,
  path,
  source: plan.tank.source,
  ...(plan.tank.plusMinus !== undefined && { plusMinus: plan.tank.plusMinus }),
})

export function describeDisplay({ tank }: Plan): Chamber {
  return {
    id: 'display',
    name: 'display',
    lengthMm: tank.displayLengthMm,
    widthMm: tank.displayWidthMm,
    waterDepthMm: tank.waterLineMm,
    heightMm: tank.insideHeightMm,
  }
}

function describeSump({ tank }: Plan): Chamber | undefined {
  const box = tank.boxes[1]
  return (
    box && {
      id: 'sump',
      name: 'sump',
      lengthMm: box.insideLengthMm,
      widthMm: box.insideWidthMm,
      waterDepthMm: box.waterDepthMm,
      heightMm: Number.POSITIVE_INFINITY,
    }
  )
}

/**
 * Where equipment can go. With a place, that one (an unknown chamber: none). Without: the chambers, else the sump, else
 * the display.
 */
export function findBasins(plan: Plan, place: Place | undefined): readonly Basin[] {
  const display = toBasin(plan, describeDisplay(plan), 'tank')
  const sump = describeSump(plan)
  const chambers = plan.tank.chambers.map((chamber, index) => toBasin(plan, chamber, `tank.chambers.${index}`))
  if (place && 'chamber' in place) {
    const all = sump ? [...chambers, toBasin(plan, sump, 'tank.sump')] : chambers
    return all.filter((basin) => basin.id === place.chamber)
  }
  if (place?.in === 'display') return [display]
  if (place?.in !== 'cabinet' && chambers.length > 0) return chambers
  if (sump) return [toBasin(plan, sump, 'tank.sump')]
  return chambers.length > 0 ? chambers : [display]
}

/** The other items that were said to be in that chamber. */
export const findOccupants = (others: readonly Item[], chamberId: string): readonly Item[] =>
  others.filter(({ place }) => place && 'chamber' in place && place.chamber === chamberId)
