import { gal, gph, inch } from './amounts'
import { createFamily } from './family'
import type { SeedPiece } from './types'

type Material = 'glass' | 'acrylic'

/** What one row of a tank's family states. */
export type Drawing = Readonly<Record<string, unknown>>

/** Outside length, width and height, then wall and bottom, in millimetres. */
export type Panes = readonly [number, number, number, number, number]

const densities = { glass: 2.5e-6, acrylic: 1.18e-6 } as const
const partitionMm = 5

/** Outside inches, walls in millimetres. */
export const inches = (l: number, w: number, h: number, wall: number, bottom: number): Panes => [
  inch(l),
  inch(w),
  inch(h),
  wall,
  bottom,
]

/** Panes, seams and fittings: 4 % over the bare panes of an open box, to half a kilogram. */
function weighShell([length, width, height, wall, bottom]: Panes, material: Material): number {
  const outer = length * width * height
  const inner = (length - 2 * wall) * (width - 2 * wall) * (height - bottom)
  return Math.round((outer - inner) * densities[material] * 1.04 * 2) / 2
}

/** What a tank's drawing states. `lineBelowTopMm`: from the top edge down to the water. */
export function drawTank(panes: Panes, nominalVolumeL: number, lineBelowTopMm: number, material: Material = 'glass') {
  const [outerLengthMm, outerWidthMm, outerHeightMm, wallMm, bottomMm] = panes
  return {
    outerLengthMm,
    outerWidthMm,
    outerHeightMm,
    wallMm,
    bottomMm,
    material,
    nominalVolumeL,
    waterLineMm: Math.round(outerHeightMm - bottomMm - lineBelowTopMm),
    dryMassKg: weighShell(panes, material),
  }
}

const chamberNames = [
  ['intake', 'intake and sponge chamber'],
  ['heater', 'heater chamber'],
  ['pump', 'return pump chamber'],
] as const

/**
 * A tank with chambers along its back wall. Outside length, width, height; wall, bottom; nominal volume; water below
 * the top edge; width of the chambers; length and water depth of intake, heater and pump chamber (0: none); flow, head,
 * watts and bore of the included pump. Millimetres and litres, or in `us` rows inches outside, gallons and gallons an
 * hour.
 */
export type RearRow = readonly number[]

function drawRear(row: RearRow, system: 'us' | 'metric', material: Material): Drawing {
  const at = (index: number) => row[index] ?? 0
  const outside = system === 'us' ? inch : (value: number) => value
  const panes: Panes = [outside(at(0)), outside(at(1)), outside(at(2)), at(3), at(4)]
  const [length, width, height, wall, bottom] = panes
  const rounded = (value: number) => Number(value.toFixed(1))
  const widthMm = at(7)
  const chambers = chamberNames.flatMap(([id, name], index) => {
    const lengthMm = at(8 + 2 * index)
    return lengthMm > 0
      ? [{ id, name, lengthMm, widthMm, waterDepthMm: at(9 + 2 * index), heightMm: rounded(height - bottom) }]
      : []
  })
  const [flow, maxHeadM, powerW, boreMm] = [at(14), at(15), at(16), at(17)]
  return {
    ...drawTank(panes, system === 'us' ? gal(at(5)) : at(5), at(6), material),
    filtration: 'rear-chambers',
    displayLengthMm: rounded(length - 2 * wall),
    displayWidthMm: rounded(width - 2 * wall - partitionMm - widthMm),
    chambers,
    includedPump: { flowLph: system === 'us' ? gph(flow) : flow, maxHeadM, powerW, plugs: 1, boreMm },
    returnBoreMm: boreMm,
  }
}

export const drawRearTanks = (
  system: 'us' | 'metric',
  rows: Readonly<Record<string, RearRow>>,
  material: Material = 'glass',
): Record<string, Drawing> =>
  Object.fromEntries(Object.entries(rows).map(([name, row]) => [name, drawRear(row, system, material)]))

type Family = Parameters<typeof createFamily>[0]

/** Tanks whose rows are drawings rather than columns. */
export function createTanks(
  head: Omit<Family, 'kind' | 'columns' | 'rows'>,
  rows: Readonly<Record<string, Drawing>>,
): SeedPiece[] {
  const columns = [...new Set(Object.values(rows).flatMap((row) => Object.keys(row)))]
  const cells = Object.entries(rows).map(([name, row]) => [name, columns.map((key) => row[key])] as const)
  return createFamily({ ...head, kind: 'tank', columns, rows: Object.fromEntries(cells) })
}
