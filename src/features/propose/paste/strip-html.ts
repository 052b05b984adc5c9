const entities: Readonly<Record<string, string>> = {
  amp: '&',
  lt: '<',
  gt: '>',
  quot: '"',
  apos: "'",
  nbsp: ' ',
  times: '×',
  deg: '°',
  frac12: '½',
  frac14: '¼',
  frac34: '¾',
  Prime: '″',
  prime: '′',
}

const decode = (text: string): string =>
  text
    .replace(/&#(\d{1,6});/g, (_, code: string) => toCharacter(Number(code)))
    .replace(/&#x([\da-f]{1,5});/gi, (_, code: string) => toCharacter(Number.parseInt(code, 16)))
    .replace(/&(\w+);/g, (whole, name: string) => entities[name] ?? whole)

const toCharacter = (code: number): string => (code > 0 && code <= 0x10ffff ? String.fromCodePoint(code) : '')

const hasTags = (text: string): boolean => /<\/?[a-z][^>]*>/i.test(text)

/** A table of a page as lines of cells with tabs between them. Text without tags stays as it is. */
export function stripHtml(text: string): string {
  if (!hasTags(text)) return text
  const bare = text
    .replace(/<(script|style|head|template)\b[\s\S]*?<\/\1\s*>/gi, '')
    .replace(/<!--[\s\S]*?-->/g, '')
    .replace(/\s+/g, ' ')
    .replace(/<\/(td|th|dt)\s*>/gi, '\t')
    .replace(/<\/?(tr|li|p|div|dd|br|h\d|table|dl|ul|ol)\b[^>]*>/gi, '\n')
    .replace(/<[^>]*>/g, '')
  return decode(bare)
}
