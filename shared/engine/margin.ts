import type { Judgement, Rule } from './rule'

/** Signed, positive = to spare: distance to a limit over its size, or to the nearer end of an interval over its width. */
export function findMargin(rule: Rule, { margin, measured, limit }: Judgement): number | null {
  if (margin !== undefined) return margin
  if (typeof measured !== 'number' || limit === undefined || limit === null || limit === 0) return null
  if (typeof limit === 'number')
    return (rule.limitIs === 'least' ? measured - limit : limit - measured) / Math.abs(limit)
  const width = limit[1] - limit[0]
  return width > 0 ? Math.min(measured - limit[0], limit[1] - measured) / width : null
}
