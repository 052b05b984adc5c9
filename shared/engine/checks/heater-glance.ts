import { getAttribute } from '../../kinds/index'
import { findLongestMm } from '../physics/geometry'
import { glanceBy, type Glance, type Way } from '../rule'
import { listAssumed, once, onceFor, type Scene } from '../scene'
import { findBasins, findOccupants, type Basin } from '../setup/places'
import { thresholds } from '../thresholds'
import type { Specs } from '../types'
import { isWithinMm, readNumber, readText } from '../values'
import { listBounds } from './rod-space'
import { hasAreas } from './shape'

export const findUsualBasins = ({ plan }: Scene) => findBasins(plan, undefined)

/** Setup paths that the room for a rod rests on. */
export const spaceUses: readonly string[] = [
  'tank.chambers.*.waterDepthMm',
  'tank.chambers.*.heightMm',
  'tank.chambers.*.lengthMm',
  'tank.chambers.*.widthMm',
  'tank.waterLineMm',
  'tank.outerHeightMm',
  'tank.displayLengthMm',
  'tank.displayWidthMm',
  'tank.outerLengthMm',
  'tank.outerWidthMm',
  'tank.bottomMm',
  'tank.wallMm',
  'tank.sump.lengthMm',
  'tank.sump.widthMm',
  'tank.sump.waterDepthMm',
  'tank.filtration',
  'tank.shape',
]

const clearanceMm = thresholds.rodClearanceMm.value

interface Water {
  readonly basin: Basin
  readonly acrossMm: number
  readonly openingMm: number
  readonly isFree: boolean
}

interface Reach {
  readonly waters: readonly Water[]
  /** A size of theirs was assumed and might be another. */
  readonly mayChange: boolean
  /** Something that the rule rests on was assumed. */
  readonly isAssumed: boolean
  /** The deepest water, mm; null where a size that more than a height follows from was assumed. */
  readonly deepestMm: number | null
}

function findReach(scene: Scene): Reach {
  const basins = once(scene, findUsualBasins)
  const assumed = basins.flatMap((basin) => listBounds(basin).filter((path) => scene.plan.assumed.has(path)))
  // Whether there is a sump beside the display may be assumed too, and its water takes other rods.
  const mayHaveSump = scene.plan.assumed.has('tank.filtration') && scene.plan.tank.chambers.length === 0
  return {
    waters: basins.map((basin) => ({
      basin,
      acrossMm: Math.min(basin.lengthMm, basin.widthMm),
      openingMm: Math.min(basin.openingLengthMm ?? Infinity, basin.openingWidthMm ?? Infinity),
      isFree: findOccupants(scene.others, basin.id).length === 0,
    })),
    mayChange: assumed.length > 0 || mayHaveSump,
    isAssumed: listAssumed(scene, spaceUses).length > 0,
    deepestMm:
      mayHaveSump || assumed.some((path) => !path.endsWith('.heightMm'))
        ? null
        : Math.max(...basins.map(({ waterDepthMm }) => waterDepthMm)),
  }
}

/** Well past the 0.05 mm that comparisons of lengths allow. */
const plainlyMm = 0.1

/** True or false only where it is plain. */
const isPlainlyWithin = (mm: number, limitMm: number): boolean | undefined =>
  mm <= limitMm ? true : mm > limitMm + plainlyMm ? false : undefined

/** One basin as rods of one thickness find it: all that does not turn on their lengths. */
interface Room {
  readonly water: Water
  /** Whether it is wide enough to stand in, by the very limits that `judge` sets. */
  readonly isWide: boolean
  /** Whether a rod that leans or lies comes in; undefined where that takes a closer look. */
  readonly takesSlanting: boolean | undefined
  /** The longest that can lean or lie, mm; null where that takes a closer look. */
  readonly longest: () => { readonly leaningMm: number | null; readonly flatMm: number | null }
}

function findLongest({ lengthMm, widthMm, waterDepthMm }: Basin, diameterMm: number) {
  const runMm = findLongestMm(diameterMm, [lengthMm - 2 * clearanceMm, widthMm - 2 * clearanceMm])
  const flatMm = findLongestMm(diameterMm + 2 * clearanceMm, [lengthMm, widthMm])
  return {
    leaningMm: runMm === null ? null : findLongestMm(diameterMm, [runMm, waterDepthMm]),
    flatMm: flatMm === null ? null : flatMm - 2 * clearanceMm,
  }
}

function measureRoom(water: Water, diameterMm: number): Room {
  const { basin, acrossMm, openingMm } = water
  const passes = isPlainlyWithin(diameterMm, Math.min(openingMm, basin.waterDepthMm))
  const isThin = isPlainlyWithin(diameterMm + 2 * clearanceMm, acrossMm)
  let longest: ReturnType<typeof findLongest> | undefined
  return {
    water,
    isWide: isWithinMm(diameterMm + 2 * clearanceMm, acrossMm) && isWithinMm(diameterMm, openingMm),
    takesSlanting: passes === false || isThin === false ? false : passes && isThin,
    longest: () => (longest ??= findLongest(basin, diameterMm)),
  }
}

/** The same for every rod as thick. */
const findRooms = (scene: Scene, diameterMm: number): readonly Room[] =>
  once(scene, findReach).waters.map((water) => measureRoom(water, diameterMm))

interface Sizes {
  readonly lengthMm: number
  readonly diameterMm: number
  readonly immersedMm: number
}

/** Whether one rod can stand there. */
const canStand = ({ isWide, water: { basin } }: Room, { lengthMm, immersedMm }: Sizes): boolean =>
  isWide && isWithinMm(immersedMm, basin.waterDepthMm) && isWithinMm(lengthMm, basin.heightMm)

/** Whether one rod can lean or lie there; undefined where that takes a closer look. */
function canSlant({ takesSlanting, longest }: Room, lengthMm: number, isLeaning: boolean): boolean | undefined {
  if (takesSlanting === false) return false
  const { leaningMm, flatMm } = longest()
  const longestMm = isLeaning ? leaningMm : flatMm
  if (longestMm === null) return undefined
  const isShort = isPlainlyWithin(lengthMm, longestMm)
  return isShort === false ? false : takesSlanting && isShort
}

type Orientation = 'vertical' | 'horizontal' | 'any'

/** Whether a single rod fits there in one of the positions; undefined where that takes a closer look. */
function canBeIn(room: Room, sizes: Sizes, orientation: Orientation): boolean | undefined {
  if (orientation !== 'horizontal' && canStand(room, sizes)) return true
  if (orientation === 'vertical') return false
  const leans = orientation === 'any' && canSlant(room, sizes.lengthMm, true)
  if (leans === true) return true
  const lies = canSlant(room, sizes.lengthMm, false)
  return lies === true ? true : lies === false && leans === false ? false : undefined
}

/** The same anywhere. */
function findRoom(rooms: readonly Room[], sizes: Sizes, orientation: Orientation): boolean | undefined {
  let isUnsure = false
  for (const room of rooms) {
    const can = canBeIn(room, sizes, orientation)
    if (can && room.water.isFree) return true
    if (can !== false) isUnsure = true
  }
  return isUnsure ? undefined : false
}

/** Whether no other size than the assumed ones would help a rod that has room nowhere. */
function isHopeless({ mayChange, deepestMm }: Reach, { immersedMm }: Sizes, orientation: string): boolean {
  if (!mayChange) return true
  if (deepestMm === null) return false
  // Only heights were assumed, and they matter to nothing but a rod that stands.
  return orientation === 'horizontal' || immersedMm > deepestMm + plainlyMm
}

/** Whether two rods as thick stand side by side there, squares as seen from above; undefined within a hair of it. */
function canPair({ basin: { lengthMm, widthMm }, acrossMm }: Water, diameterMm: number): boolean | undefined {
  const along = isPlainlyWithin(2 * diameterMm + 3 * clearanceMm, Math.max(lengthMm, widthMm))
  const across = isPlainlyWithin(diameterMm + 2 * clearanceMm, acrossMm)
  return along === false || across === false ? false : along && across
}

/** Two rods in one basin upright; a slanting one takes at least as much room, and several basins are for a closer look. */
function findRoomForTwo(rooms: readonly Room[], sizes: Sizes, orientation: string | undefined): boolean | undefined {
  const pairs = rooms.map(({ water }) => (water.isFree ? canPair(water, sizes.diameterMm) : undefined))
  if (orientation !== 'horizontal' && rooms.some((room, index) => pairs[index] && canStand(room, sizes))) return true
  return rooms.length === 1 && pairs[0] === false ? false : undefined
}

const readRod = (specs: Specs) => ({
  lengthMm: readNumber(specs, 'lengthMm'),
  diameterMm: readNumber(specs, 'diameterMm'),
  minImmersionMm: readNumber(specs, 'minImmersionMm'),
  orientation: readText(specs, 'orientation') as Orientation | undefined,
  isInline: readText(specs, 'form') === 'inline',
})

type RodFacts = ReturnType<typeof readRod>

function lookForRoom(scene: Scene, rod: RodFacts, lengthMm: number, diameterMm: number, way: Way): Glance | undefined {
  const { orientation } = rod
  const rooms = onceFor(scene, findRooms, diameterMm)
  const sizes = { lengthMm, diameterMm, immersedMm: rod.minImmersionMm ?? lengthMm }
  const alone = findRoom(rooms, sizes, orientation ?? 'vertical')
  const hasRoom = way.quantity === 2 && alone !== false ? findRoomForTwo(rooms, sizes, orientation) : alone
  if (hasRoom !== false) return hasRoom && 'pass'
  // Of a rod that does not stand and may or may not lean or lie, nothing is known.
  if (orientation === undefined && findRoom(rooms, sizes, 'any') !== false) return undefined
  return isHopeless(once(scene, findReach), sizes, orientation ?? 'vertical') ? 'never' : 'fail'
}

const usualOf = (key: string): readonly [number, number] => {
  const attribute = getAttribute('heater', key)
  if (attribute?.type !== 'measure') throw new Error(`A heater has no measure ${key}`)
  return attribute.usual
}

const usualLengthMm = usualOf('lengthMm')
const usualDiameterMm = usualOf('diameterMm')

/** How the smallest and the largest usual rod fare: a rod fits wherever a larger one does. */
function lookWithoutSize(scene: Scene, rod: RodFacts, way: Way): Glance | undefined {
  const [small, large] = ([0, 1] as const).map((end) =>
    lookForRoom(scene, rod, rod.lengthMm ?? usualLengthMm[end], rod.diameterMm ?? usualDiameterMm[end], way),
  )
  // Where the smallest has no room no other has, but what rests on an assumption condemns nothing that is not known.
  if (small === 'never' || small === 'fail') return once(scene, findReach).isAssumed ? 'unknown' : 'never'
  if (small !== 'pass') return undefined
  return large === 'pass' ? 'pass' : large === 'fail' || large === 'never' ? 'unknown' : undefined
}

/** Whether there is room for the rod, or for two, where sizes alone tell that plainly. */
export const glanceAtSpace = glanceBy(readRod, (scene, rod, way) => {
  if (rod.isInline) return scene.plan.tank.filtration === 'sump' ? 'pass' : 'change'
  if (way.place || way.quantity > 2 || !hasAreas(scene.plan)) return undefined
  const { lengthMm, diameterMm } = rod
  return lengthMm === undefined || diameterMm === undefined
    ? lookWithoutSize(scene, rod, way)
    : lookForRoom(scene, rod, lengthMm, diameterMm, way)
})
