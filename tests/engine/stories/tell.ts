import type { KnockOn } from '#shared/engine/types'
import type { GearCount, Replacement, ReplacementsResult } from '#shared/engine/swap/types'

export const tellKnockOns = ({ knockOns }: { readonly knockOns: readonly KnockOn[] }) =>
  knockOns.map(({ kind, subject, from, to }) => [kind, subject, from, to])

export const slugsOf = ({ answers }: ReplacementsResult) => answers.map(({ gear }) => gear?.slug)

export function findAnswer({ answers }: ReplacementsResult, slug: string): Replacement {
  const found = answers.find(({ gear }) => gear?.slug === slug)
  if (!found) throw new Error(`there is no answer ${slug}`)
  return found
}

export const tellOption = (option: readonly GearCount[]) =>
  option.map(({ gear, quantity }) => `${gear.slug} × ${quantity}`)

/** The numbers of a budget that moved. */
export function findMove({ knockOns }: Replacement, key: string): readonly [number, number] {
  const moved = knockOns.find(({ kind, subject }) => kind === 'budget' && subject === key)
  if (typeof moved?.from !== 'number' || typeof moved.to !== 'number') throw new Error(`${key} did not move`)
  return [moved.from, moved.to]
}
