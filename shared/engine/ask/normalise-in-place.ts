const asciiOfWide = 0xfee0

const lowerInPlace = (letter: string): string => {
  const lower = letter.toLowerCase()
  return lower.length === letter.length ? lower : letter
}

/** One spelling for what keyboards write in many, every character staying where it is, so that offsets hold. */
export const normaliseInPlace = (text: string): string =>
  text
    .replace(/[\uff01-\uff5e]/g, (wide) => String.fromCharCode(wide.charCodeAt(0) - asciiOfWide))
    .replace(/[^\S\n]|[\u00ad\u200b-\u200d\u2060\ufeff]/g, ' ')
    .replace(/[′‵’‘`´ʹʼ]/g, "'")
    .replace(/[″‶“”„ʺ〃]/g, '"')
    .replace(/[˚º]/g, '°')
    .replace(/[✕✖╳⨯⨉]/g, '×')
    .replace(/[\u2010-\u2015\u2212]/g, '-')
    .replace(/[\u2044\u2215]/g, '/')
    .replace(/[≤⩽]/g, '≤')
    .replace(/[≥⩾]/g, '≥')
    .replace(/[≈∼]/g, '~')
    .replace(/\p{Lu}/gu, lowerInPlace)
