import { stripHtml } from './strip-html'

export interface PastedLine {
  /** As it stood, for whoever looks at what became of it. */
  readonly whole: string
  readonly label: string
  readonly text: string
}

const longestLine = 300
const mostLines = 400

const splitCells = (line: string): string[] => {
  const separator = line.includes('\t') ? /\t+/ : line.includes(';') ? /;/ : line.includes('|') ? /\|/ : null
  if (separator) return line.split(separator).map((cell) => cell.trim())
  const [, label, text] = /^([^:]{1,80}?)\s*(?::|=|\.{3,}|\s{2,}|\s[–—-]\s)\s*(.+)$/.exec(line) ?? []
  return label === undefined || text === undefined ? [line.trim()] : [label.trim(), text.trim()]
}

const hasDigit = (text: string): boolean => /\d/.test(text)

/** Labels in one row and their values in the next, as a sheet of several pieces has them. */
function isTurned([first = [], second = [], ...more]: readonly string[][]): boolean {
  return (
    more.length === 0 &&
    first.length > 2 &&
    first.length === second.length &&
    !first.some(hasDigit) &&
    second.some(hasDigit)
  )
}

/** What was pasted as pairs of a label and its value; a line without a label has an empty one. */
export function splitLines(pasted: string): readonly PastedLine[] {
  const lines = stripHtml(pasted)
    .split(/\r\n?|\n/)
    .map((line) => line.replace(/^[\s•*·]+(?=\S)/, '').trimEnd())
    .filter((line) => line.trim() !== '')
    .slice(0, mostLines)
    .map((line) => line.slice(0, longestLine))
  const rows = lines.map(splitCells).map((cells) => cells.filter((cell) => cell !== ''))
  if (isTurned(rows)) {
    return (rows[0] ?? []).map((label, at) => {
      const text = rows[1]?.[at] ?? ''
      return { whole: `${label}: ${text}`, label, text }
    })
  }
  return rows.flatMap((cells, at): PastedLine[] => {
    const [label = '', ...texts] = cells
    const whole = (lines[at] ?? '').replaceAll('\t', ' ').trim()
    if (label === '') return []
    return [texts.length === 0 ? { whole, label: '', text: label } : { whole, label, text: texts.join(' ') }]
  })
}
