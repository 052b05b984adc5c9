import type { Catalogue } from '#shared/engine/swap/add-ons'
import type { Piece } from '#shared/engine/types'
import { kindKeys, type KindKey } from '#shared/kinds/index'
import { seedPieces } from '../../seeds/gear/index'
import { createSlug } from '../../server/modules/gear/slug'
import { listStates } from '../seeds/merge'

/** The newest state of every piece of the demo catalogue, as the engine reads it. */
export const demoPieces: readonly Piece[] = seedPieces.map((piece) => {
  const { slug, kind, brand, model } = piece
  const specs = Object.fromEntries(
    Object.entries(listStates(piece).at(-1) ?? {}).map(([key, { evidence: _, ...value }]) => [key, value]),
  )
  return { kind, specs, gear: { slug: slug ?? createSlug(brand, model), brand, model } }
})

/** A catalogue of these pieces alone. */
export const catalogueOf = (...pieces: readonly Piece[]): Catalogue =>
  Object.fromEntries(kindKeys.map((key) => [key, pieces.filter(({ kind }) => kind === key)])) as Record<
    KindKey,
    Piece[]
  >

/** The same by kind. */
export const demoCatalogue = catalogueOf(...demoPieces)

export function findDemo(slug: string): Piece {
  const found = demoPieces.find(({ gear }) => gear?.slug === slug)
  if (!found) throw new Error(`the demo catalogue has no ${slug}`)
  return found
}
