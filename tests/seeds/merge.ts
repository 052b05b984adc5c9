import type { SeedPiece, SeedValue } from '../../seeds/types'

type State = Readonly<Record<string, SeedValue>>

/** The full state after each revision of a piece, oldest first. */
export function listStates(piece: SeedPiece): readonly State[] {
  let state: State = {}
  return piece.revisions.map(({ values }) => {
    const merged = Object.entries({ ...state, ...values }).filter((entry): entry is [string, SeedValue] => !!entry[1])
    state = Object.fromEntries(merged)
    return state
  })
}

/** The newest bare values of a piece, with a reader for numbers. */
export function readPiece(piece: SeedPiece) {
  const state = listStates(piece).at(-1) ?? {}
  const values = Object.fromEntries(Object.entries(state).map(([key, { value }]) => [key, value]))
  const number = (key: string): number | undefined => (typeof values[key] === 'number' ? values[key] : undefined)
  const numbers = (...keys: readonly string[]): readonly number[] | null => {
    const found = keys.flatMap((key) => number(key) ?? [])
    return found.length === keys.length ? found : null
  }
  return { piece, name: `${piece.brand} ${piece.model}`, values, number, numbers }
}
