import { judgeAll } from '../assess'
import { getRules } from '../checks/index'
import { findCheapestCover } from '../cover'
import { createScene } from '../scene'
import type { Item, Piece } from '../types'
import { readSet } from '../values'
import { decideVerdict } from '../verdict'
import type { KindKey } from '../../kinds/index'
import { listMeetingKinds } from './meeting-kinds'
import {
  assessOutfit,
  changeItems,
  findUnasked,
  isWorseOff,
  listAsked,
  listStill,
  meets,
  type Outfit,
  type State,
  type Unmet,
} from './outfit'

export type Catalogue = Readonly<Record<KindKey, readonly Piece[]>>

/** Pieces that together meet a need, and ask for nothing more. */
export type Extras = readonly Item[]

const mostOptions = 3
/** Pieces that meet a need at a glance and are looked at closely together. */
const batch = 12
/** Several of one piece: two (one controller to switch a heater, another to cut it off), more where a need has an amount. */
const mostAlike = { plain: 2, amount: 4 }
/** An add-on may ask for another (a booster pump for an outlet), and that for a third. */
const mostSteps = 3

export const countPieces = (extras: Extras): number => extras.reduce((sum, { quantity }) => sum + quantity, 0)

interface Found {
  readonly extra: Item
  /** Needs that it brings along itself. */
  readonly asks: readonly string[]
  readonly changes: number
}

/** A piece that meets what is asked and fits by itself; undefined where it does not. */
function tryPiece(outfit: Outfit, state: State, asked: readonly Unmet[], extra: Item): Found | undefined {
  if (!meets(outfit, extra, asked)) return undefined
  const judged = judgeAll(createScene(outfit.plan, outfit.items), extra)
  const verdict = decideVerdict(judged)
  if (verdict === 'no' || verdict === 'unknown') return undefined
  const asks = findUnasked(listAsked(extra, judged), state.unmet).map(({ need }) => need)
  return { extra, asks, changes: judged.filter(({ outcome }) => outcome === 'change').length }
}

const slugOf = ({ piece }: Item): string => piece.gear?.slug ?? ''
const bySlug = (a: Item, b: Item): number => (slugOf(a) < slugOf(b) ? -1 : slugOf(a) > slugOf(b) ? 1 : 0)

/** Whether with the extras nothing is asked for, and nothing fails, that was not before. */
function findLeft(outfit: Outfit, state: State, extras: Extras): readonly Unmet[] | null {
  const after = assessOutfit(changeItems(outfit, [...outfit.items, ...extras]))
  if (isWorseOff(after, state)) return null
  return findUnasked(after.unmet, state.unmet)
}

/** Search for what meets one need in an outfit. */
class Search {
  readonly options: Extras[] = []

  constructor(
    private readonly outfit: Outfit,
    private readonly state: State,
    private readonly asked: readonly Unmet[],
    private readonly catalogue: Catalogue,
    private readonly step: number,
  ) {}

  private get fewest(): number {
    return Math.min(...this.options.map(countPieces))
  }

  private *walk(quantity: number): Generator<Found> {
    for (const kind of listMeetingKinds(this.asked[0]?.need ?? ''))
      for (const piece of this.catalogue[kind]) {
        const id = `add-on-${this.step}`
        const found =
          piece.gear && tryPiece(this.outfit, this.state, this.asked, { id, piece, quantity, state: 'planned' })
        if (found) yield found
      }
  }

  private keepComplete(ready: Found[]): void {
    ready.sort((a, b) => a.changes - b.changes || bySlug(a.extra, b.extra))
    for (const { extra } of ready) {
      if (this.options.length >= mostOptions) return
      if (findLeft(this.outfit, this.state, [extra])?.length === 0) this.options.push([extra])
    }
  }

  /** Pieces that need nothing more; answers those that bring along a need which something else may meet. */
  private findAlone(quantity: number): readonly Item[] {
    let ready: Found[] = []
    const later: Item[] = []
    for (const found of this.walk(quantity)) {
      if (found.asks.length === 0) ready.push(found)
      else if (found.asks.every((need) => listMeetingKinds(need).length > 0)) later.push(found.extra)
      if (ready.length < batch) continue
      this.keepComplete(ready)
      ready = []
      if (this.options.length > 0) return []
    }
    this.keepComplete(ready)
    return later.sort(bySlug)
  }

  private findFollowed(first: Item): void {
    const left = findLeft(this.outfit, this.state, [first])
    if (!left) return
    const outfit = changeItems(this.outfit, [...this.outfit.items, first])
    const more = meetAll(outfit, left, this.catalogue, this.step + 1)
    if (more) this.options.push([first, ...more])
  }

  /** Several different pieces that add up, where none does alone. */
  private findTogether(kind: KindKey): void {
    const { joint } = getRules(kind)
    if (!joint) return
    const { plan, items } = this.outfit
    const scene = createScene(plan, items)
    const able = this.catalogue[kind].filter(
      (piece) => piece.gear && ['fits', 'changes'].includes(decideVerdict(judgeAll(scene, { piece, quantity: 1 }))),
    )
    const sets = able.map(({ specs }) => readSet<string>(specs, joint.key) ?? [])
    const chosen = findCheapestCover(joint.findWanted(scene), sets)
    if (!chosen || chosen.length < 2) return
    const extras = chosen
      .flatMap((place) => able[place] ?? [])
      .map((piece, index): Item => ({ id: `add-on-${this.step}-${index}`, piece, quantity: 1, state: 'planned' }))
    if (findLeft(this.outfit, this.state, extras)?.length === 0) this.options.push(extras)
  }

  run(): readonly Extras[] {
    const most = this.asked.some(({ amount }) => amount !== null) ? mostAlike.amount : mostAlike.plain
    for (let quantity = 1; quantity <= most && quantity < this.fewest; quantity += 1) {
      const later = this.findAlone(quantity)
      if (this.options.length > 0 || this.step >= mostSteps) continue
      for (const first of later) {
        if (this.options.length >= mostOptions && this.fewest <= quantity + 1) break
        this.findFollowed(first)
      }
    }
    if (this.fewest > 2) for (const kind of listMeetingKinds(this.asked[0]?.need ?? '')) this.findTogether(kind)
    return this.options.sort((a, b) => countPieces(a) - countPieces(b)).slice(0, mostOptions)
  }
}

/** The first options for a need: of pieces in the catalogue, the fewest that meet it and ask for nothing more. */
export const findOptions = (
  outfit: Outfit,
  state: State,
  asked: readonly Unmet[],
  catalogue: Catalogue,
  step = 1,
): readonly Extras[] => new Search(outfit, state, asked, catalogue, step).run()

/** What meets several needs one after the other, a piece that meets two counted once; undefined where one cannot be met. */
function meetAll(outfit: Outfit, needs: readonly Unmet[], catalogue: Catalogue, step: number): Extras | undefined {
  const [first] = needs
  if (!first) return []
  const asked = needs.filter(({ need }) => need === first.need)
  const [best] = findOptions(outfit, assessOutfit(outfit), asked, catalogue, step)
  if (!best) return undefined
  const furnished = changeItems(outfit, [...outfit.items, ...best])
  const others = needs.filter(({ need }) => need !== first.need)
  const still = assessOutfit(furnished).unmet
  const left = listStill(others, still)
  const more = meetAll(furnished, left, catalogue, step + 1)
  return more && [...best, ...more]
}

/** Needs by name, each with all that ask for it, in the order in which they come up. */
export function groupNeeds(unmet: readonly Unmet[]): ReadonlyMap<string, readonly Unmet[]> {
  const groups = new Map<string, Unmet[]>()
  for (const one of unmet) {
    const group = groups.get(one.need)
    if (group) group.push(one)
    else groups.set(one.need, [one])
  }
  return groups
}
