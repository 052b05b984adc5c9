import type { Item, Place, Source } from '../types'
import type { Chamber, Plan } from './plan'

/** A body of water that a rod or body can be put in: a chamber, the sump, or the display itself. Inside measures, mm. */
export interface Basin extends Chamber {
  /** Setup path of its sizes, for assumptions and for questions about it. */
  readonly path: string
  readonly source: Source
  readonly plusMinus?: number
}

type Backing = Pick<Basin, 'source' | 'plusMinus'>

const toBasin = (chamber: Chamber, path: string, { source, plusMinus }: Backing): Basin => ({
  ...chamber,
  path,
  source,
  ...(plusMinus !== undefined && { plusMinus }),
})

const assumed: Backing = { source: 'estimate' }

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
 * Where equipment can go. With a place, the water that is there: a chamber by its id (the display's and the sump's too),
 * the sump in the cabinet, none hung on or outside. Without: the chambers, else the sump, else the display.
 */
export function findBasins(plan: Plan, place: Place | undefined): readonly Basin[] {
  const { specs } = plan.setup.tank
  const display = toBasin(describeDisplay(plan), 'tank', plan.tank)
  const sump = describeSump(plan)
  const sumps = sump ? [toBasin(sump, 'tank.sump', specs['sump'] ?? assumed)] : []
  const chambers = plan.tank.chambers.map((chamber, index) =>
    toBasin(chamber, `tank.chambers.${index}`, specs['chambers'] ?? assumed),
  )
  if (place && 'chamber' in place) {
    const all = [...chambers, ...sumps, display]
    return all.filter((basin) => basin.id === place.chamber).slice(0, 1)
  }
  if (place?.in === 'display') return [display]
  if (place?.in === 'cabinet') return sumps
  if (place) return []
  if (chambers.length > 0) return chambers
  return sumps.length > 0 ? sumps : [display]
}

/** The other items that were said to be in that chamber. */
export const findOccupants = (others: readonly Item[], chamberId: string): readonly Item[] =>
  others.filter(({ place }) => place && 'chamber' in place && place.chamber === chamberId)
