import { normaliseTyped } from '../units/normalise'
import { findMatchedCode, measurePattern } from './unit-words'

/** More than anybody types, and work stays in proportion to it. */
const longestRead = 400

const ownLetters: Readonly<Record<string, string>> = { ß: 'ss', æ: 'ae', œ: 'oe', ø: 'o', ł: 'l', đ: 'd', ı: 'i' }

/** Measuring tapes and pipe threads have these; other divisions are left as they are. */
const isTapeFraction = (over: number, under: number): boolean =>
  over < under && [2, 3, 4, 8, 16, 32, 64].includes(under)

const readFraction = (match: string, whole: string | undefined, over: string, under: string): string =>
  isTapeFraction(Number(over), Number(under))
    ? String(Number((Number(whole ?? 0) + Number(over) / Number(under)).toFixed(4)))
    : match

const writeMeasure = (match: string, digits: string, ...groups: (string | undefined)[]): string => {
  const code = findMatchedCode(groups)
  return code === undefined ? match : ` ${Number(digits)}${code} `
}

/** Letters without accents, one spelling of fractions, decimals and units; what cannot be seen is gone. */
const toPlain = (text: string): string =>
  normaliseTyped(text.slice(0, longestRead))
    .replaceAll('^', '')
    .normalize('NFD')
    .replace(/[\p{M}\p{Cf}]/gu, '')
    .replace(/[ßæœøłđı]/g, (letter) => ownLetters[letter] ?? letter)
    .replace(/(?:(?<![\d.])(\d+)[ -])?(?<![\d.])(\d+)\/(\d+)(?![\d/])/g, readFraction)
    .replace(/(\d),(\d{3})(?!\d)/g, '$1$2')
    .replace(/(\d),(\d)/g, '$1.$2')
    .replace(/(?<=\d[^\p{L}\p{N}]*)[x×*](?=[^\p{L}\p{N}]*\d)/gu, ' ')
    .replace(measurePattern, writeMeasure)
    .replace(/(?<=\d\p{L}*\s+)x(?=\s+\d)/gu, '')
    .replace(/(?<![\p{L}\p{N}])(\p{L}{1,3})-(?=\d)/gu, '$1')

/**
 * The words of a name or a question, in the one spelling that both are kept in: lower case, no accents or punctuation,
 * a number joined to its unit ("100 watts" is `100w`), half as `0.5`.
 */
export const toTokens = (text: string): readonly string[] => toPlain(text).match(/\d+\.\d+\p{L}*|[\p{L}\p{N}]+/gu) ?? []

/** Letters and digits alone: "T-90", "t90" and "T 90" are one code. */
export const squash = (text: string): string => toTokens(text).join('')

/** The same word in the singular, as near as a search needs it. */
export const toSingular = (word: string): string =>
  /^\p{L}{3,}[^s\d]s$/u.test(word) && !word.endsWith('us') ? word.slice(0, -1) : word
