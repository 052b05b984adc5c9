import { lookUpUnit } from '../../units/read-unit'
import { namedUnits, type NamedUnit } from '../../units/unit-names'
import type { Quantity } from '../../units/units'
import type { Token } from './token'

export interface UnitFound {
  readonly quantity: Quantity
  /** Undefined for plain "degrees": a temperature on a scale not named. */
  readonly unit: NamedUnit | undefined
  /** Index after its last token. */
  readonly to: number
}

/** What hobby questions measure; where two quantities share a spelling ("g"), the first is meant. */
const quantities: readonly Quantity[] = [
  'length',
  'volume',
  'power',
  'flow',
  'temperature',
  'mass',
  'pressure',
  'salinity',
  'concentration',
  'voltage',
  'current',
  'turnover',
  'fraction',
  'density',
]
const longestUnit = 4
/** Units to the letter, but rarely meant so in a sentence. */
const never: ReadonlySet<string> = new Set(['x', '×', 'times', 'k', 'kelvin', 'kelvins'])
/** Units only where they touch the number: "15a", but "3 a day". */
const onlyGlued: ReadonlySet<string> = new Set(['a', 'm'])
const degrees: ReadonlySet<string> = new Set(['°', 'deg', 'degs', 'degree', 'degrees'])
const afterPreposition: ReadonlySet<string> = new Set(
  (
    'the a an my our your this that it here there winter summer spring fall autumn january february march april may ' +
    'june july august september october november december both each total general stock place case mind one which ' +
    'most some any cold hot daytime during'
  ).split(' '),
)

/** "62 in winter" holds no inches; "12 in" and "12 in deep" do. */
const isPreposition = (tokens: readonly Token[], at: number): boolean => {
  const token = tokens[at]
  return token?.text === 'in' && !token.glued && afterPreposition.has(tokens[at + 1]?.text ?? '')
}

const lookUp = (name: string): UnitFound | undefined => {
  for (const quantity of quantities) {
    const unit = lookUpUnit(name, quantity)
    if (unit !== undefined) return { quantity, unit, to: 0 }
  }
  return undefined
}

const spellings: ReadonlySet<string> = new Set(
  quantities
    .flatMap((quantity) => namedUnits[quantity].flatMap((unit) => [unit.symbol, ...unit.spellings]))
    .map((name) => name.toLowerCase().replace(/[\s.]/g, '')),
)
/** Words that start no unit are passed over at once. */
const beginnings: ReadonlySet<string> = new Set(
  [...spellings].flatMap((name) => Array.from(name, (_, last) => name.slice(0, last + 1))),
)
const perWords: ReadonlySet<string> = new Set(['per', 'a', 'an'])

/** "10x" is a turnover only where that word follows. */
const isUnitHere = (name: string, next: Token | undefined): boolean =>
  !never.has(name) || next?.text === 'turnover' || next?.text === 'turnovers'

const canStart = (tokens: readonly Token[], at: number): boolean => {
  const token = tokens[at]
  if (token === undefined || token.type === 'stop' || token.type === 'number') return false
  return token.glued || !onlyGlued.has(token.text)
}

/** The unit that starts at a token, the longest that makes sense: "gallons a day" before "gallons". */
export const readUnit = (tokens: readonly Token[], at: number): UnitFound | undefined => {
  if (!canStart(tokens, at) || isPreposition(tokens, at)) return undefined
  let best: UnitFound | undefined
  let key = ''
  const names: string[] = []
  for (let to = at + 1; to <= at + longestUnit; to++) {
    const token = tokens[to - 1]
    if (token === undefined || token.type === 'stop' || token.type === 'number') break
    key += perWords.has(token.text) && to > at + 1 ? '/' : token.text
    if (!beginnings.has(key)) break
    names.push(token.text)
    const name = names.join(' ')
    const found = spellings.has(key) && isUnitHere(name, tokens[to]) ? lookUp(name) : undefined
    if (found !== undefined) best = { ...found, to }
  }
  if (best !== undefined || !degrees.has(tokens[at]?.text ?? '')) return best
  return { quantity: 'temperature', unit: undefined, to: at + 1 }
}
