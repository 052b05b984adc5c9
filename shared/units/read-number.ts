export interface ScannedNumber {
  readonly ok: true
  readonly value: number
  /** As understood: "4 1/2", "25.5". */
  readonly written: string
  /** Index after its last character. */
  readonly end: number
}

export interface Refusal {
  readonly ok: false
  readonly reason: string
}

export const refuse = (reason: string): Refusal => ({ ok: false, reason })

const mixed = /(\d+)(?: ?- ?| )(\d+) ?\/ ?(\d+)(?![\d.,])/y
const fraction = /(\d+) ?\/ ?(\d+)(?![\d.,])/y
const decimal = /(\d*)(?:([.,])(\d+))?\.?/y

const matchAt = (pattern: RegExp, text: string, start: number): RegExpExecArray | null => {
  pattern.lastIndex = start
  return pattern.exec(text)
}

const readFraction = (whole: string, top: string, bottom: string, end: number): ScannedNumber | Refusal => {
  const written = whole === '' ? `${top}/${bottom}` : `${whole} ${top}/${bottom}`
  if (Number(bottom) === 0) return refuse(`"${written}" divides by zero.`)
  if (whole !== '' && Number(top) >= Number(bottom)) return refuse(`"${written}": the fraction is not less than one.`)
  return { ok: true, value: Number(whole) + Number(top) / Number(bottom), written, end }
}

/** Reads `4 1/2`, `4-1/2`, `3/4`, `25.5`, `25,5` or `.5` at `start` of normalised text. Thousands are never guessed. */
export const scanNumber = (text: string, start: number): ScannedNumber | Refusal => {
  const asMixed = matchAt(mixed, text, start)
  if (asMixed) return readFraction(asMixed[1] ?? '', asMixed[2] ?? '', asMixed[3] ?? '', start + asMixed[0].length)
  const asFraction = matchAt(fraction, text, start)
  if (asFraction) return readFraction('', asFraction[1] ?? '', asFraction[2] ?? '', start + asFraction[0].length)

  const [whole = '', digits = '', mark = '', decimals = ''] = matchAt(decimal, text, start) ?? []
  if (digits === '' && decimals === '') return refuse('This has no number where one should stand.')
  const end = start + whole.length
  if (/^[.,]\d/.test(text.slice(end))) return refuse('Write the number without thousands separators.')
  if (mark === ',' && decimals.length === 3 && Number(digits) !== 0) {
    return refuse(
      `"${digits},${decimals}" can be read two ways: write ${digits}.${decimals} or ${digits}${decimals} instead.`,
    )
  }
  const written = (digits.replace(/^0+(?=\d)/, '') || '0') + (decimals === '' ? '' : `.${decimals}`)
  return { ok: true, value: Number(written), written, end }
}
