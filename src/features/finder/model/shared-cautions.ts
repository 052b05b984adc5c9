import type { Answer } from '#shared/engine/types'

/** Cautions that hold for every one of several answers: said once above them instead of in each. */
export function findSharedCautions(answers: readonly Answer[]): readonly string[] {
  const [first, ...rest] = answers
  if (!first || rest.length === 0) return []
  return first.cautions.filter((caution) => rest.every(({ cautions }) => cautions.includes(caution)))
}
