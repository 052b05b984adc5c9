import { bodied, footprintOf } from '../checks/body-space'
import type { KindKey } from '../../kinds/index'
import type { Rectangle } from '../physics/geometry'
import { packRectangles, type Packing } from '../physics/packing'
import { describeDisplay, findBasins, type Basin } from '../setup/places'
import type { Plan } from '../setup/plan'
import { resolve } from '../setup/resolve'
import { thresholds } from '../thresholds'
import type { Item, Placement, Setup } from '../types'
import { readNumber } from '../values'

/** A piece in its chamber: corner nearest the left back, sides as turned, mm. `heightMm` null: nobody recorded it. */
export interface PackedPiece {
  readonly itemId: string
  readonly xMm: number
  readonly yMm: number
  readonly lengthMm: number
  readonly widthMm: number
  readonly heightMm: number | null
  readonly isRod: boolean
}

export interface PackedChamber {
  readonly id: string
  readonly name: string
  readonly lengthMm: number
  readonly widthMm: number
  readonly waterDepthMm: number
  /** `no`: drawn in a row, past the walls if need be. */
  readonly outcome: Packing['outcome']
  readonly pieces: readonly PackedPiece[]
  /** Items that stand here too and have no recorded size. */
  readonly unsized: readonly string[]
}

export interface PackingDrawing {
  readonly chambers: readonly PackedChamber[]
}

interface Standing {
  readonly item: Item
  readonly sides: Rectangle
  readonly heightMm: number | null
}

type Placements = ReadonlyMap<string, Placement>

const clearanceMm = thresholds.pumpClearanceMm.value
const rodClearanceMm = thresholds.rodClearanceMm.value
const radians = (deg: number) => (deg * Math.PI) / 180

/** A rod that leans or lies takes its run in plan; its height is what it reaches up to. */
function standRod(item: Item, placement: Placement | undefined): Standing | undefined {
  const lengthMm = readNumber(item.piece.specs, 'lengthMm')
  const diameterMm = readNumber(item.piece.specs, 'diameterMm')
  if (diameterMm === undefined) return undefined
  if (lengthMm === undefined || placement === undefined || placement.position === 'upright')
    return { item, sides: [diameterMm, diameterMm], heightMm: lengthMm ?? null }
  const angle = placement.position === 'flat' ? 0 : radians(placement.angleDeg)
  return {
    item,
    sides: [lengthMm * Math.cos(angle) + diameterMm * Math.sin(angle), diameterMm],
    heightMm: lengthMm * Math.sin(angle) + diameterMm * Math.cos(angle),
  }
}

function standBody(item: Item, placements: Placements): Standing | undefined {
  if (item.piece.kind === 'heater') return standRod(item, placements.get(item.id))
  const sides = footprintOf(item)
  return sides && { item, sides, heightMm: readNumber(item.piece.specs, 'heightMm') ?? null }
}

/** Chambers are often called by what is meant to stand in them. */
const kindWords: Readonly<Partial<Record<KindKey, string>>> = {
  heater: 'heater',
  'return-pump': 'pump',
  skimmer: 'skimmer',
}

const expand = (standing: readonly Standing[]): readonly Standing[] =>
  standing.flatMap((one) => Array.from({ length: one.item.quantity }, () => one))

/** Rods keep further from each other than bodies do: with one among them, all keep that. */
function pack(standing: readonly Standing[], basin: Pick<Basin, 'lengthMm' | 'widthMm'>): Packing {
  const apart = standing.some(({ item }) => item.piece.kind === 'heater') ? rodClearanceMm : clearanceMm
  return packRectangles(
    standing.map(({ sides }) => sides),
    [basin.lengthMm, basin.widthMm],
    apart,
  )
}

/** Side by side from the left where there is no arrangement, so that what is too much can be seen. */
function lineUp(standing: readonly Standing[]) {
  let xMm = clearanceMm
  return standing.map(({ sides: [lengthMm, widthMm] }, piece) => {
    const placed = { piece, xMm, yMm: clearanceMm, lengthMm, widthMm }
    xMm += lengthMm + clearanceMm
    return placed
  })
}

function arrange(basin: Omit<PackedChamber, 'outcome' | 'pieces' | 'unsized'>, items: readonly Item[], at: Placements) {
  const standing = expand(items.flatMap((item) => standBody(item, at) ?? []))
  const packing = pack(standing, basin)
  const placed = packing.outcome === 'fits' ? packing.placed : lineUp(standing)
  const pieces = placed.flatMap(({ piece, ...spot }): PackedPiece[] => {
    const one = standing[piece]
    if (!one) return []
    return [{ itemId: one.item.id, ...spot, heightMm: one.heightMm, isRod: one.item.piece.kind === 'heater' }]
  })
  const unsized = items.filter((item) => !standBody(item, at)).map(({ id }) => id)
  const { id, name, lengthMm, widthMm, waterDepthMm } = basin
  return { id, name, lengthMm, widthMm, waterDepthMm, outcome: packing.outcome, pieces, unsized }
}

/** Where each body stands: as said, as it was judged, else in the first chamber that still has room for it. */
function shareOut(plan: Plan, basins: readonly Basin[], placements: Placements): ReadonlyMap<string, readonly Item[]> {
  const shares = new Map<string, Item[]>()
  const add = (id: string, item: Item) => shares.set(id, [...(shares.get(id) ?? []), item])
  const bodies = plan.items.filter(({ piece }) => bodied.has(piece.kind) && piece.specs.form?.value !== 'inline')
  for (const item of bodies) {
    const stated = item.place && findBasins(plan, item.place)
    if (stated) {
      if (stated[0]) add(stated[0].id, item)
      continue
    }
    const judged = placements.get(item.id)?.chamber
    const hasRoom = ({ id, ...sides }: Basin) => {
      const company = [...(shares.get(id) ?? []), item].flatMap((one) => standBody(one, placements) ?? [])
      return pack(expand(company), sides).outcome === 'fits'
    }
    const named = basins.filter(({ name }) => name.toLowerCase().includes(kindWords[item.piece.kind] ?? ''))
    const usual =
      item.piece.kind === 'wavemaker' ? 'display' : (named.find(hasRoom) ?? basins.find(hasRoom) ?? basins[0])?.id
    const id = judged ?? usual
    if (id !== undefined) add(id, item)
  }
  return shares
}

/**
 * What stands in which chamber, side by side, from above. `placements` is how the report placed its rods. Chambers are
 * always drawn, other water where something stands in it. RangeError where the tank has neither size nor volume.
 */
export function drawPacking(setup: Setup, placements: Placements = new Map()): PackingDrawing {
  const plan = resolve(setup)
  const basins = findBasins(plan, undefined)
  const shares = shareOut(plan, basins, placements)
  const isDisplayApart = !basins.some(({ id }) => id === 'display')
  const all = [...basins, ...(isDisplayApart ? [describeDisplay(plan)] : [])]
  const isDrawn = (id: string) => shares.has(id) || plan.tank.chambers.some((chamber) => chamber.id === id)
  return {
    chambers: all
      .filter(({ id }) => isDrawn(id))
      .map((basin) => arrange(basin, shares.get(basin.id) ?? [], placements)),
  }
}
