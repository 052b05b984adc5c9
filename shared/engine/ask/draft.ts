import { findSetupField } from '../../kinds/setup-fields'
import { amountIn, writeAmount, type Amount } from './amounts'
import type { FieldValue, Filter, ReadField, Understood } from './types'
import type { Token } from './token'

/** A stretch of tokens: `to` is not included. */
export interface Span {
  readonly from: number
  readonly to: number
}

interface Note {
  readonly meaning: string
  readonly path?: string
}

/** What has been read so far. Every token is used once at most; what nobody uses is left over. */
export interface Draft {
  readonly fields: Record<string, ReadField>
  readonly filters: Record<string, Filter>
  readonly understood: Understood[]
  isUsed(at: number): boolean
  /** Takes the tokens of the spans. */
  use(...spans: readonly Span[]): void
  /** Takes the spans and says what they mean; cues that stand apart from the first span are taken in silence. */
  note(note: Note, span: Span, ...cues: readonly Span[]): void
  /** The first value given for a path stays; one that the setup could not hold is not taken. */
  setField(path: string, value: FieldValue, text: string): boolean
  setAmount(path: string, amount: Amount): boolean
  /** Whether the setup could hold it there. */
  canHold(path: string, amount: Amount): boolean
  setFilter(key: string, filter: Filter): boolean
}

const setOnce = <T>(record: Record<string, T>, key: string, value: T): boolean => {
  if (Object.hasOwn(record, key)) return false
  record[key] = value
  return true
}

/** Inside the range that its field can plausibly have. */
const canHold = (path: string, value: FieldValue): boolean => {
  const attribute = findSetupField(path)?.attribute
  if (attribute?.type !== 'measure') return attribute !== undefined
  return typeof value === 'number' && value >= attribute.plausible[0] && value <= attribute.plausible[1]
}

/** An amount in the unit of its field; undefined where the field could not hold it. */
const valueAt = (path: string, amount: Amount): number | undefined => {
  const attribute = findSetupField(path)?.attribute
  if (attribute?.type !== 'measure') return undefined
  const value = amountIn(amount, attribute.unit)
  return canHold(path, value) ? value : undefined
}

export const createDraft = (text: string, tokens: readonly Token[]): Draft => {
  const used = new Set<number>()
  const isUsed = (at: number) => used.has(at)
  const use = (...spans: readonly Span[]) => {
    for (const { from, to } of spans) for (let at = from; at < to; at++) used.add(at)
  }
  /** The span with the cues beside it, as far as nothing that is used already or ends a phrase lies between. */
  const reach = (span: Span, cues: readonly Span[]): Span => {
    const isFree = (from: number, to: number) =>
      tokens.slice(from, to).every((token, offset) => !used.has(from + offset) && token.type !== 'stop')
    let { from, to } = span
    for (const cue of cues.toSorted((a, b) => b.from - a.from))
      if (cue.from < from && isFree(cue.from, from)) from = cue.from
    for (const cue of cues.toSorted((a, b) => a.to - b.to)) if (cue.to > to && isFree(to, cue.to)) to = cue.to
    return { from, to }
  }
  const fields: Record<string, ReadField> = {}
  const filters: Record<string, Filter> = {}
  const understood: Understood[] = []
  return {
    fields,
    filters,
    understood,
    isUsed,
    use,
    note: (note, span, ...cues) => {
      const stretch = reach(span, cues)
      use(span, ...cues)
      const start = tokens[stretch.from]?.start ?? 0
      const end = tokens[stretch.to - 1]?.end ?? start
      understood.push({ text: text.slice(start, end), ...note, start, end })
    },
    setField: (path, value, typed) => canHold(path, value) && setOnce(fields, path, { value, text: typed }),
    setAmount: (path, amount) => {
      const value = valueAt(path, amount)
      return value !== undefined && setOnce(fields, path, { value, text: writeAmount(amount) })
    },
    canHold: (path, amount) => valueAt(path, amount) !== undefined,
    setFilter: (key, filter) => setOnce(filters, key, filter),
  }
}
