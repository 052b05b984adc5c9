import { getKind, kindKeys, type KindKey } from '#shared/kinds/index'
import type { Source } from '#shared/engine/types'
import { specsInputSchema } from '#shared/schemas/specs'
import type { PieceInput, ValueInput } from '../../server/modules/gear/gear.types'
import { drawHeaterFamily } from './draw-heaters'
import { drawCharacter, drawValues } from './draw-values'
import { drawBrand, drawLine } from './names'
import { createRandom, type Random } from './random'

export interface CatalogueSize {
  readonly pieces: number
  /** From 0 to 1. */
  readonly heaterShare: number
}

interface Member {
  readonly size: string
  readonly values: Record<string, unknown>
}

const letterSizes = ['XS', 'S', 'M', 'L', 'XL', 'XXL'] as const

function drawFamily(kind: KindKey, random: Random): readonly Member[] {
  if (kind === 'heater') return drawHeaterFamily(random)
  const { attributes } = getKind(kind)
  const character = drawCharacter(attributes, random)
  const sizes = letterSizes.slice(0, 2 + Math.floor(random.between(0, letterSizes.length - 1)))
  return sizes.map((size, index) => ({
    size,
    values: drawValues(attributes, character, index / (sizes.length - 1), random),
  }))
}

/** Leaves out what contradicts the rest, as if nobody had recorded it, until the kind's own schema has nothing against it. */
function keepValid(kind: KindKey, values: Record<string, unknown>): Record<string, unknown> {
  const left = { ...values }
  for (;;) {
    const { error } = specsInputSchema(kind).safeParse(left)
    if (!error) return left
    for (const { path } of error.issues) Reflect.deleteProperty(left, String(path[0]))
  }
}

function backValues(values: Record<string, unknown>, random: Random): Record<string, ValueInput> {
  const isMeasured = random.chance(0.15)
  return Object.fromEntries(
    Object.entries(values).map(([key, value]): [string, ValueInput] => {
      const source: Source = isMeasured && typeof value === 'number' && random.chance(0.5) ? 'measured' : 'maker'
      return [key, { value, source, evidence: 'generated for measuring' }]
    }),
  )
}

/** Made-up gear in families of sizes, each piece valid by its kind's schema; the same catalogue for the same size. */
export function* generatePieces({ pieces, heaterShare }: CatalogueSize): Generator<PieceInput> {
  const random = createRandom(pieces)
  const otherKinds = kindKeys.filter((kind) => kind !== 'heater')
  const heaters = Math.round(pieces * heaterShare)
  const left = { heater: heaters, other: pieces - heaters }
  for (let family = 1; left.heater + left.other > 0; family += 1) {
    const group = random.next() * (left.heater + left.other) < left.heater ? 'heater' : 'other'
    const kind = group === 'heater' ? 'heater' : random.pick(otherKinds)
    const brand = drawBrand(random)
    const line = drawLine(random, family)
    for (const { size, values } of drawFamily(kind, random).slice(0, left[group])) {
      left[group] -= 1
      const backed = backValues(keepValid(kind, values), random)
      yield {
        kind,
        brand,
        model: `${line} ${size}`,
        status: random.chance(0.9) ? 'current' : 'discontinued',
        revisions: [{ date: '2025-01-01', author: 'generated', values: backed }],
      }
    }
  }
}
