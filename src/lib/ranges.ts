export interface Range {
  readonly from: number | null
  readonly to: number | null
}

const rangePattern = /^(-?\d+(?:\.\d+)?)?\.\.(-?\d+(?:\.\d+)?)?$/

/** `50..150`, `50..`, `..150` as numbers; null for anything else. */
export function parseRange(text: string | undefined): Range | null {
  const [whole, from, to] = rangePattern.exec(text ?? '') ?? []
  if (whole === undefined) return null
  return { from: from === undefined ? null : Number(from), to: to === undefined ? null : Number(to) }
}

// Nine decimals are as many as the API reads; a millionth of a millimetre is finer than any tape.
const writeNumber = (value: number): string => String(Number(value.toFixed(9)))

export function writeRange({ from, to }: Range): string {
  return `${from === null ? '' : writeNumber(from)}..${to === null ? '' : writeNumber(to)}`
}
