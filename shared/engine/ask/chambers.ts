import type { Draft } from './draft'

/** More than any tank has; what comes after is left over. */
const most = 12
const sides = ['lengthMm', 'widthMm', 'waterDepthMm', 'heightMm', 'openingLengthMm'] as const

const isStarted = ({ fields }: Draft, index: number): boolean =>
  sides.some((side) => Object.hasOwn(fields, `tank.chambers.${index}.${side}`))

/** The place of the first chamber of which nothing is said yet. */
export const nextChamber = (draft: Draft): number | undefined => {
  for (let index = 0; index < most; index++) if (!isStarted(draft, index)) return index
  return undefined
}

/** The place of the chamber that was spoken of last; the first where there is none. */
export const lastChamber = (draft: Draft): number => Math.max(0, (nextChamber(draft) ?? most) - 1)
