import type { KindKey } from '../../kinds/index'
import { findPhrases, indexPhrases } from './phrases'
import type { Landmark } from './landmarks'
import type { Token } from './token'
import { gonePhrases, replacePhrases } from './words/intent-words'

type KindLandmark = Landmark & { readonly kind: KindKey }

/** Asked for far less often than named as what the asked-for piece goes with. */
const base: Readonly<Partial<Record<KindKey, number>>> = { tank: 3, sand: 6, rock: 6, stand: 8, net: 8 }
const usual = 10
/** Under this a tank is only what the rest goes with. */
const leastForTank = 9
const weights = { asked: 8, replaced: 6, gone: 6, first: 3, qualified: 2, owned: -5, towards: -4 } as const

const asking: ReadonlySet<string> = new Set(
  "which what need needs want looking find recommend suggest recommendation recommendations best buy get any another new whats what's good seeking after size much many replace replacement show".split(
    ' ',
  ),
)
const owning: ReadonlySet<string> = new Set('have has got with already on existing own had has my'.split(' '))
const towards: ReadonlySet<string> = new Set('for in into of fit fits to under over'.split(' '))
const refusing: ReadonlySet<string> = new Set(['no', 'without', 'not', "don't"])
const qualifying: ReadonlySet<string> = new Set('for that to which under with'.split(' '))
const skipped: ReadonlySet<string> = new Set('a an the my this our your of some'.split(' '))
const replacing = indexPhrases(replacePhrases.map((phrase) => [phrase, true] as const))
const going = indexPhrases(gonePhrases.map((phrase) => [phrase, true] as const))
const window = 6

const endsClause = (token: Token | undefined): boolean => token === undefined || token.type === 'stop'

const wordsBefore = (tokens: readonly Token[], at: number, others: ReadonlySet<number>): readonly string[] => {
  const words: string[] = []
  for (let back = at - 1; back >= Math.max(0, at - window); back--) {
    const token = tokens[back]
    if (token === undefined || endsClause(token) || others.has(back)) break
    words.push(token.text)
  }
  return words
}

const isWithin = (places: ReadonlySet<number>, from: number, to: number): boolean => {
  for (let at = from; at < to; at++) if (places.has(at)) return true
  return false
}

const startsOf = (tokens: readonly Token[], index: Parameters<typeof findPhrases>[0]): ReadonlySet<number> =>
  new Set(findPhrases(index, tokens).map(({ from }) => from))

/** "what do I need for my tank" asks for no tank; "looking for a tank" does. */
const isAsked = (kind: KindKey, before: readonly string[]): boolean => {
  const place = before.findIndex((word) => asking.has(word))
  const between = before.slice(0, before[place] === 'looking' ? place - 1 : place)
  return place !== -1 && !(kind === 'tank' && between.some((word) => towards.has(word)))
}

/** The kind that the text asks about, by the words around each kind that it names; null where it names none. */
export const chooseKind = (tokens: readonly Token[], landmarks: readonly Landmark[]): KindLandmark | null => {
  const isRefused = ({ from }: Landmark) => refusing.has(tokens[from - 1]?.text ?? '')
  const named = landmarks.filter(
    (landmark): landmark is KindLandmark => landmark.kind !== undefined && !isRefused(landmark),
  )
  const replaced = startsOf(tokens, replacing)
  const gone = startsOf(tokens, going)
  const occupied = new Set(
    named.flatMap(({ from, to }) => Array.from({ length: to - from }, (_, offset) => from + offset)),
  )
  const score = ({ from, to, kind }: KindLandmark, index: number): number => {
    const before = wordsBefore(tokens, from, occupied)
    const next = named[index + 1]?.from ?? tokens.length
    const near = before.find((word) => !skipped.has(word)) ?? ''
    const isReplaced = isWithin(replaced, from - before.length, from)
    const isGone = isWithin(gone, to, Math.min(next, to + window))
    const isOwned = !isReplaced && !isGone && before.slice(0, 3).some((word) => owning.has(word))
    return (
      (base[kind] ?? usual) +
      (isAsked(kind, before) ? weights.asked : 0) +
      (isReplaced ? weights.replaced : 0) +
      (isGone ? weights.gone : 0) +
      (index === 0 ? weights.first : 0) +
      (qualifying.has(tokens[to]?.text ?? '') ? weights.qualified : 0) +
      (isOwned ? weights.owned : 0) +
      (towards.has(near) ? weights.towards : 0)
    )
  }
  let best: { readonly landmark: KindLandmark; readonly points: number } | null = null
  for (const [index, landmark] of named.entries()) {
    const points = score(landmark, index)
    if (best === null || points > best.points) best = { landmark, points }
  }
  const isOnlyContext = best?.landmark.kind === 'tank' && best.points < leastForTank
  return best === null || isOnlyContext ? null : best.landmark
}
