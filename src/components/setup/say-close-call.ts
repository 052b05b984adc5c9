import type { Check } from '#shared/engine/types'

/** "a close call, 93 % sure"; undefined where it is none. */
export function sayCloseCall({ closeCall, probability }: Check): string | undefined {
  if (closeCall === undefined || probability === undefined) return undefined
  return `a close call, ${Math.round(probability * 100)} % sure`
}
