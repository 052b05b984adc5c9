import { readEntries } from './consistency-lists'
import type { BareSpecs, Inconsistency } from './types'

/** Sizes are read to the millimetre, so a sum of several may be that much over. */
const toleranceMm = 1

const readNumbers =
  (specs: BareSpecs) =>
  (key: string): number | undefined => {
    const value = specs[key]
    return typeof value === 'number' ? value : undefined
  }

const subtract = (from: number | undefined, what: number | undefined): number | undefined =>
  from === undefined ? undefined : from - (what ?? 0)

const isAbove = (a: number | undefined, b: number | undefined): boolean =>
  a !== undefined && b !== undefined && a > b + toleranceMm

interface Inside {
  readonly lengthMm: number | undefined
  readonly widthMm: number | undefined
  readonly heightMm: number | undefined
}

/** Walls thinner than half the tank; water, display and chambers inside it. Unknown sizes are not judged. */
export function findTankFaults(specs: BareSpecs): Inconsistency[] {
  const number = readNumbers(specs)
  const wallMm = number('wallMm')
  const walls = wallMm === undefined ? undefined : 2 * wallMm
  const inside: Inside = {
    lengthMm: subtract(number('outerLengthMm'), walls),
    widthMm: subtract(number('outerWidthMm'), walls),
    heightMm: subtract(number('outerHeightMm'), number('bottomMm')),
  }
  const isSolid = [inside.lengthMm, inside.widthMm].some((size) => size !== undefined && size <= 0)
  if (isSolid) return [{ path: 'wallMm', detail: 'walls must be thinner than half of the tank' }]
  if (inside.heightMm !== undefined && inside.heightMm <= 0) {
    return [
      {
        path: 'bottomMm',
        detail: 'the bottom must be thinner than the tank is high',
      },
    ]
  }
  const faults: Inconsistency[] = []
  if (isAbove(number('waterLineMm'), inside.heightMm)) {
    faults.push({
      path: 'waterLineMm',
      detail: 'the water line must be below the top edge',
    })
  }
  if (isAbove(number('displayLengthMm'), inside.lengthMm)) {
    faults.push({
      path: 'displayLengthMm',
      detail: 'the display must fit inside the tank',
    })
  }
  if (isAbove(number('displayWidthMm'), inside.widthMm)) {
    faults.push({
      path: 'displayWidthMm',
      detail: 'the display must fit inside the tank',
    })
  }
  return [...faults, ...findChamberFaults(specs['chambers'], inside), ...findFloorFaults(specs, inside)]
}

function findChamberFaults(chambers: unknown, inside: Inside): Inconsistency[] {
  const seen = new Set<unknown>()
  return readEntries(chambers).flatMap(({ index, entry }) => {
    const number = readNumbers(entry)
    const fault = (key: string, detail: string) => ({
      path: `chambers.${index}.${key}`,
      detail,
    })
    const faults: Inconsistency[] = []
    if (entry['id'] !== undefined && seen.has(entry['id'])) faults.push(fault('id', 'two chambers have the same id'))
    seen.add(entry['id'])
    for (const [key, limit] of [
      ['lengthMm', inside.lengthMm],
      ['widthMm', inside.widthMm],
      ['waterDepthMm', inside.heightMm],
      ['heightMm', inside.heightMm],
    ] as const) {
      if (isAbove(number(key), limit)) faults.push(fault(key, 'a chamber must fit inside the tank'))
    }
    if (isAbove(number('waterDepthMm'), number('heightMm'))) {
      faults.push(fault('waterDepthMm', 'the water in a chamber must not stand above the chamber'))
    }
    if (isAbove(number('openingLengthMm'), number('lengthMm'))) {
      faults.push(fault('openingLengthMm', 'an opening must not be larger than its chamber'))
    }
    if (isAbove(number('openingWidthMm'), number('widthMm'))) {
      faults.push(fault('openingWidthMm', 'an opening must not be larger than its chamber'))
    }
    return faults
  })
}

/** Display and chambers share one floor: together they cannot cover more than all of it. */
function findFloorFaults(specs: BareSpecs, { lengthMm, widthMm }: Inside): Inconsistency[] {
  if (lengthMm === undefined || widthMm === undefined) return []
  const number = readNumbers(specs)
  const areaOf = (length: number | undefined, width: number | undefined) => (length ?? 0) * (width ?? 0)
  const chambers = readEntries(specs['chambers']).reduce((sum, { entry }) => {
    const size = readNumbers(entry)
    return sum + areaOf(size('lengthMm'), size('widthMm'))
  }, 0)
  const display = areaOf(number('displayLengthMm'), number('displayWidthMm'))
  const floor = (lengthMm + toleranceMm) * (widthMm + toleranceMm)
  if (chambers > floor)
    return [
      {
        path: 'chambers',
        detail: 'the chambers together are larger than the floor of the tank',
      },
    ]
  if (chambers > 0 && chambers + display > floor) {
    return [
      {
        path: 'chambers',
        detail: 'display and chambers together are larger than the floor of the tank',
      },
    ]
  }
  return []
}
