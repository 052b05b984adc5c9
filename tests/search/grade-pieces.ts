import type { Grade, Judgements } from './queries/types'

export interface JudgedPiece {
  readonly slug: string
  readonly kind: string
  readonly specs: Readonly<Record<string, unknown>>
}

function holdsValue(value: unknown, wanted: string): boolean {
  const range = /^(.+)\.\.(.+)$/.exec(wanted)
  if (range !== null) return typeof value === 'number' && value >= Number(range[1]) && value <= Number(range[2])
  return Array.isArray(value) ? value.map(String).includes(wanted) : String(value) === wanted
}

function matchesPattern({ slug, kind, specs }: JudgedPiece, pattern: string): boolean {
  const ofKind = /^kind:([a-z-]+)(?:\[(.+)\])?$/.exec(pattern)
  if (ofKind === null) return new RegExp(`^${pattern.replaceAll('*', '.*')}$`).test(slug)
  const wanted = (ofKind[2] ?? '').split(',').filter((each) => each !== '')
  return (
    ofKind[1] === kind && wanted.every((each) => holdsValue(specs[each.split('=')[0] ?? ''], each.split('=')[1] ?? ''))
  )
}

const grades: readonly Grade[] = [3, 2, 1]

/** The best grade that any pattern gives the piece; 0 where none does. */
export function gradePiece(piece: JudgedPiece, judgements: Judgements): number {
  const isOf = (grade: Grade) =>
    (judgements[grade] ?? '').split(' ').some((each) => each !== '' && matchesPattern(piece, each))
  return grades.find(isOf) ?? 0
}
