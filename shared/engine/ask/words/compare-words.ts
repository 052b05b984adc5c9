/** Which side of a number is meant. */
export type Bound = 'most' | 'least' | 'about'

const before: Readonly<Record<Bound, string>> = {
  most:
    'under, below, less than, smaller than, shorter than, narrower than, thinner than, no more than, not more than, at most, up to, max, ' +
    'maximum, max of, maximum of, within, not over, no longer than, no bigger than, no larger than, no taller than, no wider than, no deeper than, no higher than, not longer than, not ' +
    'bigger than, cheaper than, limit of, <, ≤, < =, fits in, fit in, at the most, not exceeding, beneath, weaker than, lower than, not taller than, not to exceed, no thicker than',
  least:
    'at least, over, above, more than, min, minimum, min of, minimum of, longer than, bigger than, larger than, no less than, not less than, no smaller than, ' +
    'not under, greater than, >, ≥, > =, stronger than, upwards of, at minimum, at the least, exceeding, no shorter than, higher than, taller than, holds, holding, supports, can hold, can take, rated for, to hold, holds up to, supporting, to support, that holds',
  about:
    'about, around, roughly, approx, approximately, ~, circa, ca, close to, something like, near, nearly, almost, more or less, say, give or take, ish',
}

const after: Readonly<Record<Bound, string>> = {
  most: 'or less, or under, or smaller, or shorter, or below, max, maximum, tops, at most, at the most, or fewer, and under, limit, or lower, or thinner, and below, at max',
  least:
    'or more, or over, or longer, or bigger, or larger, or above, or greater, min, minimum, plus, +, at least, and up, or better, or higher, or stronger, and over, upwards',
  about: 'ish, or so, approx, approximately, give or take, roughly, or thereabouts, - ish, or around',
}

const toPhrases = (table: Readonly<Record<Bound, string>>): readonly (readonly [string, Bound])[] =>
  Object.entries(table).flatMap(([bound, list]) =>
    list.split(', ').map((phrase) => [phrase.trim(), bound as Bound] as const),
  )

export const boundsBefore = toPhrases(before)
export const boundsAfter = toPhrases(after)
