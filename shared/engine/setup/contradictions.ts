import { readGroups, readNumber, readText } from '../values'
import type { ChamberInput, Contradiction, Setup, Specs } from '../types'
import { defaultPlusMinus } from '../physics/conformance'
import { lengthToleranceMm } from '../physics/geometry'
import { listChamberIds } from './chamber-ids'
import type { TankPlan } from './plan'
import { resolveTank } from './tank'
import { createPrinter, type Printer } from '../../units/print'

const toleranceMm = lengthToleranceMm

/** What rock and sand displace contradicts no size. */
const nothingDisplaced = () => 0
const asIs = <T>(_key: string, value: T): T => value

/**
 * What sizes may be apart without contradicting each other, mm. Sizes of one source were read together; a drawing and
 * somebody's calipers each have a ± of their own.
 */
function findLeewayMm(specs: Specs): number {
  const sources = new Set(Object.values(specs).map((entry) => entry?.source))
  return sources.size > 1 ? defaultPlusMinus.measured.lengthMm + defaultPlusMinus.maker.lengthMm : toleranceMm
}
const sizes = ['outerLengthMm', 'outerWidthMm', 'outerHeightMm'] as const

/** A corner tank fills about half of the square that its outside sizes span, a cylinder three quarters. */
const leastShareBy: Readonly<Record<string, number>> = { corner: 0.2, cylinder: 0.3 }

function checkShell(setup: Setup, words: Printer): Contradiction[] {
  const { specs } = setup.tank
  const read = (key: string) => readNumber(specs, key)
  const [length, width, height] = sizes.map(read)
  const wall = read('wallMm')
  const bottom = read('bottomMm')
  const found: Contradiction[] = []
  const narrowest = Math.min(length ?? Infinity, width ?? Infinity)
  if (wall !== undefined && 2 * wall >= narrowest)
    found.push({
      path: 'tank.wallMm',
      detail: `Two walls of ${words.length(wall)} leave no inside in a tank ${words.length(narrowest)} across.`,
    })
  if (bottom !== undefined && height !== undefined && bottom >= height)
    found.push({
      path: 'tank.bottomMm',
      detail: `A bottom of ${words.length(bottom)} leaves no inside in a tank ${words.length(height)} high.`,
    })
  const volumeL = read('nominalVolumeL') ?? setup.tank.volumeL
  if (volumeL !== undefined && length && width && height) {
    const outsideL = (length * width * height) / 1e6
    const volumePath = read('nominalVolumeL') === undefined ? 'tank.volumeL' : 'tank.nominalVolumeL'
    const leastShare = leastShareBy[readText(specs, 'shape') ?? ''] ?? 0.4
    // Nominal volumes are often rounded up to a trade size, so a little more than the outside holds is let pass.
    if (volumeL > 1.1 * outsideL)
      found.push({
        path: volumePath,
        detail: `${words.volume(volumeL)} is more than ${words.size([length, width, height])} holds, ${words.volume(outsideL)} on the outside.`,
      })
    if (volumeL < leastShare * outsideL)
      found.push({
        path: volumePath,
        detail: `${words.volume(volumeL)} is far less than ${words.size([length, width, height])} holds, ${words.volume(outsideL)} on the outside.`,
      })
  }
  return found
}

function checkChamber(
  chamber: ChamberInput,
  index: number,
  tank: TankPlan,
  leewayMm: number,
  isGiven: (key: string) => boolean,
  words: Printer,
): Contradiction[] {
  const inside = (key: string, along: string) =>
    isGiven(key)
      ? `the tank’s inside ${along}`
      : `the inside ${along} that we assumed from the volume; give the tank’s outside size`
  const height = inside('outerHeightMm', 'height')
  const exceed = (key: keyof ChamberInput, limitMm: number, what: string): Contradiction[] => {
    const value = chamber[key]
    if (typeof value !== 'number' || value <= limitMm + leewayMm) return []
    return [
      {
        path: `tank.chambers.${index}.${key}`,
        detail: `${words.length(value)} is more than ${what} (${words.length(limitMm)}).`,
      },
    ]
  }
  return [
    ...exceed('lengthMm', tank.insideLengthMm, inside('outerLengthMm', 'length')),
    ...exceed('widthMm', tank.insideWidthMm, inside('outerWidthMm', 'width')),
    ...exceed('waterDepthMm', tank.insideHeightMm, height),
    ...exceed('heightMm', tank.insideHeightMm, height),
    ...exceed('openingLengthMm', chamber.lengthMm ?? Infinity, 'the chamber’s length'),
    ...exceed('openingWidthMm', chamber.widthMm ?? Infinity, 'the chamber’s width'),
    ...(chamber.heightMm === undefined ? [] : exceed('waterDepthMm', chamber.heightMm, 'the chamber’s height')),
  ]
}

function checkChambers(setup: Setup, tank: TankPlan, words: Printer): Contradiction[] {
  const chambers = readGroups<ChamberInput>(setup.tank.specs, 'chambers') ?? []
  const isGiven = (key: string) => readNumber(setup.tank.specs, key) !== undefined
  const leewayMm = findLeewayMm(setup.tank.specs)
  const found = chambers.flatMap((chamber, index) => checkChamber(chamber, index, tank, leewayMm, isGiven, words))
  const total = chambers.reduce((sum, chamber) => sum + (chamber.lengthMm ?? 0), 0)
  if (chambers.length > 1 && total > tank.insideLengthMm + leewayMm)
    found.push({
      path: 'tank.chambers',
      detail: `The chambers are ${words.length(total)} long together, and the tank is ${words.length(tank.insideLengthMm)} inside.`,
    })
  const ids = chambers.map(({ id }) => id)
  ids.forEach((id, index) => {
    if (ids.indexOf(id) < index)
      found.push({ path: `tank.chambers.${index}.id`, detail: `Two chambers are called “${id}”.` })
  })
  return found
}

function checkRoom({ room }: Setup, words: Printer): Contradiction[] {
  const { coldestC, temperatureC, warmestC, tankTopMm, ceilingMm } = room ?? {}
  const found: Contradiction[] = []
  const order = (path: string, low: number | undefined, high: number | undefined, detail: string) => {
    if (low !== undefined && high !== undefined && low > high)
      found.push({ path, detail: `${detail}: ${words.temperature(low)} against ${words.temperature(high)}.` })
  }
  order('room.coldestC', coldestC, temperatureC, 'The coldest room is warmer than the usual one')
  order('room.warmestC', temperatureC, warmestC, 'The usual room is warmer than the warmest')
  if (temperatureC === undefined)
    order('room.warmestC', coldestC, warmestC, 'The coldest room is warmer than the warmest')
  if (tankTopMm !== undefined && ceilingMm !== undefined && tankTopMm > ceilingMm + toleranceMm)
    found.push({
      path: 'room.tankTopMm',
      detail: `The tank’s top edge at ${words.length(tankTopMm)} is above the ceiling at ${words.length(ceilingMm)}.`,
    })
  return found
}

function checkItems(setup: Setup): Contradiction[] {
  if (setup.items.length === 0) return []
  const chambers = listChamberIds(setup.tank.specs)
  const ids = setup.items.map(({ id }) => id)
  return setup.items.flatMap(({ id, piece, place }, index): Contradiction[] => [
    ...(piece.kind === 'tank'
      ? [{ path: `items.${index}.kind`, detail: 'A tank is no item of a setup: say it as the setup’s tank.' }]
      : []),
    ...(ids.indexOf(id) < index ? [{ path: `items.${index}.id`, detail: `Two items have the id “${id}”.` }] : []),
    ...(place && 'chamber' in place && !chambers.has(place.chamber)
      ? [{ path: `items.${index}.place.chamber`, detail: `The tank has no chamber “${place.chamber}”.` }]
      : []),
  ])
}

function checkFilling(setup: Setup, tank: TankPlan, words: Printer): Contradiction[] {
  const found: Contradiction[] = []
  const { sandDepthMm, rockKg, turnoverPerHour } = setup.goals ?? {}
  if (sandDepthMm !== undefined && sandDepthMm >= tank.waterLineMm)
    found.push({
      path: 'goals.sandDepthMm',
      detail: `${words.length(sandDepthMm)} of sand leaves no water under a water line of ${words.length(tank.waterLineMm)}.`,
    })
  if (rockKg !== undefined && rockKg / 2.7 >= tank.grossL)
    found.push({
      path: 'goals.rockKg',
      detail: `${words.mass(rockKg)} of rock leaves no water in ${words.volume(tank.grossL)}.`,
    })
  if (turnoverPerHour && turnoverPerHour[0] > turnoverPerHour[1])
    found.push({ path: 'goals.turnoverPerHour', detail: 'The least turnover is more than the greatest.' })
  return found
}

/** Every part of a setup that contradicts another or cannot exist, in the setup's own units; empty where it can be judged. */
export function findContradictions(setup: Setup): readonly Contradiction[] {
  const words = createPrinter(setup.units)
  const { specs, volumeL } = setup.tank
  const hasSize = sizes.every((key) => readNumber(specs, key) !== undefined)
  if (!hasSize && volumeL === undefined && readNumber(specs, 'nominalVolumeL') === undefined)
    return [{ path: 'tank', detail: 'Give the tank’s outside length, width and height, or its volume.' }]
  const shell = checkShell(setup, words)
  if (shell.length > 0) return [...shell, ...checkRoom(setup, words), ...checkItems(setup)]
  const tank = resolveTank(setup.tank, nothingDisplaced, asIs)
  const line = readNumber(specs, 'waterLineMm')
  const inside: Contradiction[] = []
  const within = (path: string, value: number | undefined, limitMm: number, what: string) => {
    if (value !== undefined && value > limitMm + leewayMm)
      inside.push({ path, detail: `${words.length(value)} is more than ${what} (${words.length(limitMm)}).` })
  }
  const leewayMm = findLeewayMm(specs)
  const top = setup.room?.tankTopMm
  if (top !== undefined && hasSize && top < tank.outerHeightMm - toleranceMm)
    inside.push({
      path: 'room.tankTopMm',
      detail: `A tank ${words.length(tank.outerHeightMm)} high cannot have its top edge ${words.length(top)} above the floor.`,
    })
  within('tank.waterLineMm', line, tank.insideHeightMm, 'the tank’s inside height')
  within('tank.displayLengthMm', readNumber(specs, 'displayLengthMm'), tank.insideLengthMm, 'the tank’s inside length')
  within('tank.displayWidthMm', readNumber(specs, 'displayWidthMm'), tank.insideWidthMm, 'the tank’s inside width')
  return [
    ...inside,
    ...checkChambers(setup, tank, words),
    ...checkRoom(setup, words),
    ...checkFilling(setup, tank, words),
    ...checkItems(setup),
  ]
}
