import { normaliseTyped } from '../../units/normalise'
import { scanNumber } from '../../units/read-number'
import { normaliseInPlace } from './normalise-in-place'
import { joinNumberWords } from './number-words'
import type { Token } from './token'

const pieces = [
  // "4 1/2", "4-1/2"; "4½", "½"; "3/8"; "25.5", "25,5", "1,200"; ".5"
  String.raw`(?<number>\d+(?: ?- ?| )\d+ ?\/ ?\d+(?![\d/])|(?:\d+ ?)?[¼-¾⅐-⅞]|\d+ ?\/ ?\d+(?![\d/])|\d+(?:[.,]\d+)*|(?<![\p{L}\p{N}])\.\d+)`,
  // A unit run into the next number of a row: "4inx5in".
  String.raw`(?<word>(?:in|cm|mm|ft)(?=x\d)|\p{L}[\p{L}\p{M}]*(?:'\p{L}+)*)`,
  String.raw`(?<sign>''|[^\s\p{L}\p{N}.,;:?!()[\]{}…])`,
  String.raw`(?<stop>\n|[^\s])`,
]
const pattern = new RegExp(pieces.join('|'), 'gu')
const glyphs = /[¼-¾⅐-⅞]/
const thousands = /^\d{1,3}(?:,\d{3})+(?:\.\d+)?$/

const readNumberToken = (text: string) => {
  const read = scanNumber(glyphs.test(text) ? normaliseTyped(text) : text, 0)
  if (thousands.test(text)) return { grouped: Number(text.replaceAll(',', '')), ...(read.ok && { value: read.value }) }
  return read.ok ? { value: read.value } : {}
}

const split = (text: string): Token[] => {
  const tokens: Token[] = []
  for (const match of text.matchAll(pattern)) {
    const groups = match.groups ?? {}
    const type = groups.number ? 'number' : groups.word ? 'word' : groups.sign ? 'sign' : 'stop'
    const start = match.index
    const end = start + match[0].length
    const token = { type, text: match[0] === "''" ? '"' : match[0], start, end } as const
    const glued = start > 0 && tokens.at(-1)?.end === start
    const sign = tokens.at(-1)
    const isNegative = type === 'number' && glued && sign?.text === '-' && !sign.glued
    tokens.push({
      ...token,
      glued,
      ...(isNegative && { isNegative }),
      ...(type === 'number' && readNumberToken(match[0])),
    })
  }
  return tokens
}

/** "rear-chamber" is two words; the hyphen of "20-gallon" and "8-10" stays, for who reads numbers. */
const dropHyphens = (tokens: readonly Token[]): Token[] =>
  tokens.filter((token, index) => {
    const before = tokens[index - 1]
    const after = tokens[index + 1]
    const isInside = token.glued && after?.glued && before?.type === 'word' && after.type === 'word'
    return !(token.text === '-' && isInside)
  })

/** Words, numbers, signs and stops of a text, in order, with their places in it. */
export const tokenise = (text: string): readonly Token[] => joinNumberWords(dropHyphens(split(normaliseInPlace(text))))

/** The number of "T-90" or "ph8" belongs to a name. */
export const isPartOfName = (tokens: readonly Token[], at: number): boolean => {
  const token = tokens[at]
  let before = at - 1
  if (!token?.glued) return false
  if (tokens[before]?.text === '-' && tokens[before]?.glued) before--
  const word = tokens[before]
  if (word?.type !== 'word' || word.text === 'x' || word.text === 'by') return false
  const owner = tokens[before - 1]
  return !(word.glued && (owner?.type === 'number' || owner?.text === '°'))
}
