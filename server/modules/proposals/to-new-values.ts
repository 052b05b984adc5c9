import type { ProposedValues } from '../../db/schema/index'
import type { NewValue } from '../gear/gear-history.service'

/** Proposed values as a revision keeps them. */
export function toNewValues(values: ProposedValues, authorId: number, today = new Date()): NewValue[] {
  return Object.entries(values).map(([key, proposed]) => {
    if (proposed === null) {
      return { key, value: null, source: null, dated: today.toISOString().slice(0, 10), authorId }
    }
    const { value, raw, source, plusMinus, evidence, files, date } = proposed
    return {
      key,
      value,
      source,
      dated: date,
      authorId,
      ...(raw !== undefined && { raw }),
      ...(plusMinus !== undefined && { plusMinus }),
      ...(evidence !== undefined && { evidence }),
      ...(files !== undefined && { files: [...files] }),
    }
  })
}
