/** The first of 1, 2 and 5 times a power of ten that is at least `size`. */
export function niceStep(size: number): number {
  const power = 10 ** Math.floor(Math.log10(size))
  const factor = [1, 2, 5, 10].find((candidate) => candidate * power >= size * (1 - 1e-9)) ?? 10
  return factor * power
}

export interface Ticks {
  readonly step: number
  readonly major: readonly number[]
  /** Between the major ones, without label. */
  readonly minor: readonly number[]
}

/** Multiples of a step, computed from whole numbers so that 0.3 is not 0.30000000000000004. */
function multiples(step: number, from: number, to: number): number[] {
  const first = Math.ceil(from / step - 1e-9)
  const last = Math.floor(to / step + 1e-9)
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, at) => Number(((first + at) * step).toPrecision(12)))
}

/** Into quarters or fifths, whichever leaves round numbers: 1 by 0.2, 2 by 0.5, 5 by 1; an inch into quarters. */
function subdivide(step: number, isInches: boolean): number {
  const leading = Math.round(step / 10 ** Math.floor(Math.log10(step) + 1e-9))
  return leading === 2 || (isInches && step === 1) ? 4 : 5
}

/** Round ticks from `from` to `to`: the finest step of 1, 2 or 5 times a power of ten with at most `most` labels. */
export function niceTicks(from: number, to: number, most: number, isInches = false): Ticks {
  if (!(to > from)) return { step: 1, major: [from], minor: [] }
  let step = niceStep((to - from) / Math.max(1, most))
  let major = multiples(step, from, to)
  while (major.length > Math.max(1, most)) {
    step = niceStep(step * 1.5)
    major = multiples(step, from, to)
  }
  const minor = multiples(step / subdivide(step, isInches), from, to)
  return { step, major, minor: minor.filter((value) => !major.includes(value)) }
}
