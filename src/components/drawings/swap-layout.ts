import type { Specs, Verdict } from '#shared/engine/types'
import type { KindKey } from '#shared/kinds/index'
import type { RodDrawing } from './tank-drawing'

/** One of those that are drawn side by side. */
export interface LinedUp {
  readonly letter: string
  readonly name: string
  readonly specs: Specs
  /** Null: what is gone. */
  readonly verdict: Verdict | null
  readonly place?: Pick<RodDrawing, 'chamber' | 'position' | 'angleDeg'> | undefined
}

/** What all of them have to do with, seen from the front: water of a chamber around them, or a length over or under them. */
export interface Surrounding {
  readonly name: string
  readonly lengthMm: number
  /** Left out: a length alone, drawn under the pieces. */
  readonly heightMm?: number
  /** Front to back, for rods that lean that way. */
  readonly widthMm?: number
}

const frontKeys: Readonly<Partial<Record<KindKey, readonly [string, string]>>> = {
  tank: ['outerLengthMm', 'outerHeightMm'],
  stand: ['topLengthMm', 'heightMm'],
  heater: ['diameterMm', 'lengthMm'],
}

export const readSide = (specs: Specs, key: string): number | null => {
  const value = specs[key]?.value
  return typeof value === 'number' ? value : null
}

export interface Front {
  readonly lengthMm: number | null
  readonly heightMm: number | null
}

/** Of a piece as it stands before one: how far across and how high. Null: nobody recorded it. */
export function frontOf(kind: KindKey, specs: Specs): Front {
  const [across, up] = frontKeys[kind] ?? ['lengthMm', 'heightMm']
  return { lengthMm: readSide(specs, across), heightMm: readSide(specs, up) }
}
