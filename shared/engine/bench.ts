import { assessAll, assessItem, judgeAll, type Assessment } from './assess'
import { addUp } from './budgets'
import type { Judged } from './judge'
import { isConcededBy, isOpen } from './concession'
import { diff, isDemand, type RawKnockOn } from './knock-ons'
import { checkEssentials } from './needs'
import type { Candidate } from './rule'
import { createScene, withItems, type Scene } from './scene'
import { listChamberIds } from './setup/chamber-ids'
import type { Plan } from './setup/plan'
import { resolve } from './setup/resolve'
import { hasSize } from './setup/tank'
import type { Item, Piece, Setup } from './types'
import { getKind, type KindKey } from '../kinds/index'

/** What a piece takes the place of, or that it takes no place. */
export interface Seat {
  readonly instead?: readonly string[]
  readonly beside?: boolean
}

/** A piece that is gone, which `before` counts as if it were there. */
export interface GonePiece {
  readonly item: Item
  /** By every rule of its kind, in its place. */
  readonly judged: readonly Judged[]
  /** The same by rule: what it asked already, its replacement is not charged with. */
  readonly byRule: ReadonlyMap<string, Judged>
}

/** The setup a candidate joins: what is left when it takes the place of its kind's pieces, or of the one that is gone. */
export interface Bench {
  readonly scene: Scene
  readonly before: Assessment
  readonly kind: KindKey
  readonly gone?: GonePiece
}

export const candidateId = 'candidate'
/** The tank is no item; where the tank itself is gone, this is its id, unless an item has it. */
export const tankId = 'tank'

/** Items that stay when a piece of `kind` is judged: kinds that add up count beside what is there. */
function keepItems(plan: Plan, kind: KindKey, options: Seat): readonly Item[] {
  if (options.instead) return plan.items.filter((item) => !options.instead?.includes(item.id))
  if (options.beside ?? getKind(kind).additive) return plan.items
  return plan.items.filter((item) => item.piece.kind !== kind)
}

/**
 * What could not be judged only because the kind's pieces were taken out, as it was with them there: a mount is held
 * against the light that the setup has until another takes its place.
 */
function judgeOpenWith(whole: Plan, left: Assessment): Assessment {
  if (!left.items.some(({ judged }) => judged.some(isOpen))) return left
  const items = left.items.map((one) => {
    if (!one.judged.some(isOpen)) return one
    const before = new Map(assessItem(whole, whole.items, one.item).judged.map((judged) => [judged.rule.id, judged]))
    const judged = one.judged.map((now) => {
      const was = before.get(now.rule.id)
      return isOpen(now) && was && was.outcome !== 'fail' ? was : now
    })
    return { ...one, judged }
  })
  return { ...left, items }
}

/** Prepares a setup for judging pieces of one kind. RangeError where the tank has neither size nor volume. */
export function setBench(setup: Setup, kind: KindKey, options: Seat = {}): Bench {
  const whole = resolve(setup)
  const others = keepItems(whole, kind, options)
  // What makes room stays listed as gone: what was planned tells what the piece has to live up to.
  const left = setup.items.map((item) => (others.includes(item) ? item : { ...item, state: 'gone' as const }))
  const isWhole = others.length === whole.items.length
  const plan = isWhole ? whole : resolve(withItems(setup, left))
  const before = assessAll(plan, others)
  return { scene: createScene(plan, others), before: isWhole ? before : judgeOpenWith(whole, before), kind }
}

const describeGone = (item: Item, judged: readonly Judged[]): GonePiece => ({
  item,
  judged,
  byRule: new Map(judged.map((one) => [one.rule.id, one])),
})

function setTankBench(setup: Setup): Bench {
  const plan = resolve(setup)
  const { specs, gear } = setup.tank
  const piece: Piece = { kind: 'tank', specs, ...(gear && { gear }) }
  const scene = createScene(plan, plan.items)
  const item: Item = { id: tankId, piece, quantity: 1, state: 'have' }
  const gone = describeGone(item, judgeAll(scene, { piece, quantity: 1 }))
  return { scene, before: assessAll(plan, plan.items), kind: 'tank', gone }
}

/**
 * Prepares a setup for judging what can take the place of one item, or of the tank: what is gone counts before as if it
 * were there. Undefined where nothing has that id; RangeError where the tank has neither size nor volume.
 */
export function setSwapBench(setup: Setup, goneId: string): Bench | undefined {
  const gone = setup.items.find(({ id }) => id === goneId)
  if (!gone) return goneId === tankId ? setTankBench(setup) : undefined
  const item: Item = gone.state === 'gone' ? { ...gone, state: 'have' } : gone
  const plan = resolve(
    withItems(
      setup,
      setup.items.map((one) => (one === gone ? item : one)),
    ),
  )
  const before = assessAll(plan, plan.items)
  const judged = before.items.find((one) => one.item === item)?.judged ?? []
  const scene = createScene(
    plan,
    plan.items.filter((other) => other !== item),
  )
  return { scene, before, kind: item.piece.kind, gone: describeGone(item, judged) }
}

/** The setup's items with the candidate among them, where what is gone stood, else last. */
function seatCandidate({ scene, before, gone }: Bench, candidate: Candidate): readonly Item[] {
  const { piece, quantity, place, mountHeightMm } = candidate
  const item: Item = {
    id: gone?.item.id ?? candidateId,
    piece,
    quantity,
    state: 'planned',
    ...(place && { place }),
    ...(mountHeightMm !== undefined && { mountHeightMm }),
  }
  if (!gone) return [...scene.others, item]
  return before.plan.items.map((one) => (one === gone.item ? item : one))
}

/** What stays, in another tank: what was said to stand in a chamber that it does not have may stand anywhere. */
function moveInto(tank: Piece, items: readonly Item[]): readonly Item[] {
  const ids = listChamberIds(tank.specs)
  return items.map((item) => {
    const { place, ...rest } = item
    return place && 'chamber' in place && !ids.has(place.chamber) ? rest : item
  })
}

/** The setup's items once the candidate has come; the tank itself is none. */
export const listAfter = (bench: Bench, candidate: Candidate): readonly Item[] =>
  bench.kind === 'tank' ? moveInto(candidate.piece, bench.scene.others) : seatCandidate(bench, candidate)

export function planAfter({ scene, before, kind, gone }: Bench, { piece }: Candidate, items: readonly Item[]): Plan {
  const { setup } = scene.plan
  if (kind === 'tank')
    return resolve(withItems(setup, items, { specs: piece.specs, ...(piece.gear && { gear: piece.gear }) }))
  return gone ? resolve(withItems(setup, items)) : before.plan
}

/** The whole setup with the candidate in it, judged but for the candidate itself. */
export function assessAfter(bench: Bench, candidate: Candidate): Assessment {
  const items = listAfter(bench, candidate)
  const others = bench.kind === 'tank' ? items : bench.scene.others
  const plan = planAfter(bench, candidate, items)
  return {
    plan,
    items: others.map((other) => assessItem(plan, items, other)),
    essentials: checkEssentials(plan, items),
    budgets: addUp(plan, items),
  }
}

/** A tank of unknown size cannot be put in the setup; what it asks itself is all that can be said. */
export const canSeat = ({ kind }: Bench, { piece }: Candidate): boolean => kind !== 'tank' || hasSize(piece.specs)

/** What changes elsewhere with the candidate in its place, moved budgets and what is freed included. */
export const findRestChanges = (bench: Bench, candidate: Candidate): readonly RawKnockOn[] =>
  canSeat(bench, candidate) ? diff(bench.before, assessAfter(bench, candidate)) : []

/** What the candidate's arrival makes the rest of the setup ask: checks that got worse, essentials that went missing. */
export function findRestKnockOns(bench: Bench, candidate: Candidate): readonly RawKnockOn[] {
  if (bench.scene.others.length === 0 && !bench.gone) return []
  return findRestChanges(bench, candidate).filter(isDemand)
}

/** Whether what is gone asked for all of that already. */
export const isConceded = ({ gone }: Bench, judged: Judged): boolean =>
  isConcededBy(gone?.byRule.get(judged.rule.id), judged)
