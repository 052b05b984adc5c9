/** Everything typed is longer only by mistake; work on it stays in proportion to this. */
export const longestTyped = 120

/**
 * One spelling for what keyboards, phones and makers' sheets write in many: widths, primes, dashes, spaces, fractions.
 * Vulgar fractions get a space before them first, as compatibility decomposition turns `11½` into `111⁄2`; raised and
 * lowered digits are marked, as it turns `5²` into `52`.
 */
export const normaliseTyped = (text: string): string =>
  text
    .replace(/[\u00ad\u200b-\u200d\u2060\ufeff]/g, '')
    .replace(/[′‵’‘`´ʹʼ]/g, "'")
    .replace(/[″‶“”„ʺ〃]/g, '"')
    .replace(/[˚º]/g, '°')
    .replace(/[¼-¾⅐-⅞↉]/g, ' $&')
    .replace(/[²³¹⁰⁴-⁹₀-₉]/g, '^$&')
    .normalize('NFKC')
    .toLowerCase()
    .replace(/[\u2044\u2215]/g, '/')
    .replace(/[\u2010-\u2015\u2212]/g, '-')
    .replace(/''/g, '"')
    .replace(/\s+/g, ' ')
    .trim()
