import { findLoadLimits } from './physics/loads'
import { once, type Scene } from './scene'
import type { Plan } from './setup/plan'
import type { Item } from './types'
import { readNumber } from './values'

export interface Outlets {
  readonly used: number
  readonly capacity: number
  /** Items that state no number of plugs: not counted. */
  readonly unknown: readonly string[]
}

export interface Load {
  readonly watts: number
  readonly unknown: readonly string[]
}

const ofKind = (items: readonly Item[], kind: string) => items.filter((item) => item.piece.kind === kind)

function sum(items: readonly Item[], key: string): { total: number; unknown: string[] } {
  const unknown: string[] = []
  let total = 0
  for (const { id, piece, quantity } of items) {
    const value = readNumber(piece.specs, key)
    if (value === undefined) unknown.push(id)
    else total += value * quantity
  }
  return { total, unknown }
}

/** Kinds that plug in; a strip's own plug is counted with the wall outlet it takes, not here. */
export const pluggedIn: ReadonlySet<string> = new Set([
  'light',
  'light-controller',
  'heater',
  'temperature-controller',
  'return-pump',
  'wavemaker',
  'skimmer',
  'auto-top-off',
  'booster-pump',
])

/** The pump that came with the tank, until another takes its place. */
export const findIncludedPump = ({ tank }: Plan, items: readonly Item[]) =>
  ofKind(items, 'return-pump').length > 0 ? undefined : tank.includedPump

/** Plugs that need an outlet of strip or wall: heaters on a controller's own outlets do not. */
export function countPlugs(plan: Plan, items: readonly Item[]): Outlets {
  const plugs = sum(
    items.filter((item) => pluggedIn.has(item.piece.kind)),
    'plugs',
  )
  const onControllers = Math.min(
    sum(ofKind(items, 'temperature-controller'), 'outlets').total,
    sum(ofKind(items, 'heater'), 'plugs').total,
  )
  const pump = findIncludedPump(plan, items)
  const included = pump ? (pump.plugs ?? 1) : 0
  return {
    used: plugs.total - onControllers + included,
    capacity: countOutlets(plan, items),
    unknown: plugs.unknown,
  }
}

/**
 * Outlets of the strips plus the wall's, less the one that each strip takes. A strip without a wall outlet of its own
 * would hang on another strip and does not count, but for a single one: whoever counts no free outlet has it plugged in.
 */
export function countOutlets(plan: Plan, items: readonly Item[]): number {
  const strips = ofKind(items, 'power-strip').flatMap(({ piece, quantity }) =>
    Array.from({ length: quantity }, () => readNumber(piece.specs, 'outlets') ?? 0),
  )
  const onTheWall = strips.sort((a, b) => b - a).slice(0, Math.max(1, plan.mains.outlets))
  return onTheWall.reduce((total, outlets) => total + outlets, 0) + Math.max(0, plan.mains.outlets - strips.length)
}

/** Everything that can run longer than three hours, heaters at full power, W. */
export function sumLoad(plan: Plan, items: readonly Item[]): Load {
  const watts = sum(
    items.filter((item) => pluggedIn.has(item.piece.kind)),
    'powerW',
  )
  return { watts: watts.total + (findIncludedPump(plan, items)?.powerW ?? 0), unknown: watts.unknown }
}

/** Rated and continuous load in W of the weakest strip and the circuit. */
export function findLimits(plan: Plan, items: readonly Item[]) {
  const ratings = ofKind(items, 'power-strip').map((item) => readNumber(item.piece.specs, 'ratedA'))
  const known = ratings.filter((rating) => rating !== undefined)
  return findLoadLimits(plan.mains.volts, [plan.mains.circuitA, ...known])
}

const countOthers = ({ plan, others }: Scene) => countPlugs(plan, others)
const loadOthers = ({ plan, others }: Scene) => sumLoad(plan, others)
const limitOthers = ({ plan, others }: Scene) => findLimits(plan, others)

export const otherPlugs = (scene: Scene): Outlets => once(scene, countOthers)
export const otherLoad = (scene: Scene): Load => once(scene, loadOthers)
export const otherLimits = (scene: Scene) => once(scene, limitOthers)

export interface Controllers {
  readonly maxLoadW: number
  /** Of the strongest one. */
  readonly strongestW: number
  readonly outlets: number
  readonly loadedW: number
  readonly pluggedIn: number
  readonly count: number
  /** A controller or a heater on it does not state what its load, power, outlets or plugs are. */
  readonly isUnsure: boolean
}

/** Temperature controllers among the others, and what heaters already hang on them. */
function sumControllers({ others }: Scene): Controllers {
  const controllers = ofKind(others, 'temperature-controller')
  const heaters = ofKind(others, 'heater')
  const capacity = sum(controllers, 'maxLoadW')
  const outlets = sum(controllers, 'outlets')
  const loaded = sum(heaters, 'powerW')
  const plugs = sum(heaters, 'plugs')
  return {
    maxLoadW: capacity.total,
    strongestW: Math.max(0, ...controllers.map(({ piece }) => readNumber(piece.specs, 'maxLoadW') ?? 0)),
    outlets: outlets.total,
    loadedW: loaded.total,
    pluggedIn: plugs.total,
    count: controllers.reduce((count, { quantity }) => count + quantity, 0),
    isUnsure: [capacity, outlets, loaded, plugs].some(({ unknown }) => unknown.length > 0),
  }
}

export const otherControllers = (scene: Scene): Controllers => once(scene, sumControllers)
