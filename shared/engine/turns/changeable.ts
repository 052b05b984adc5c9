import type { Printer } from '../../units/print'
import { countOf } from '../counting'
import type { Plan } from '../setup/plan'

/** One number of a setup said otherwise. */
export interface Move {
  readonly path: string
  readonly from: number
  readonly to: number
  readonly plan: Plan
}

/** A number of the setup that a person can change or choose; what belongs to the house or the climate is left out. */
export interface Changeable {
  /** Dotted setup path, `*` for the place of a chamber. */
  readonly path: string
  /** The only way that makes sense, where not both do: nobody cools a room to need a stronger heater. */
  readonly only?: 'more' | 'less'
  /** Of the tank and what it stands on: changed for room alone: a tank is not filled less for a weak stand. */
  readonly isBuilt?: true
  /** What animals live in: never said further than they are usually kept. */
  readonly isLivedIn?: true
  /** Counted from what it is ("12 mm longer") rather than named itself ("at least 20 °C"). */
  readonly isRelative?: true
  /** What would have to hold, to stand after "It would fit if". */
  readonly say: (move: Move, words: Printer) => string
}

/** "the rear chamber were 12 mm longer" */
const sized = (
  path: string,
  name: (move: Move) => string,
  [more, less]: readonly [string, string],
  rest: Partial<Changeable> = { isBuilt: true },
): Changeable => ({
  path,
  isRelative: true,
  ...rest,
  say: (move, words) => {
    const { from, to } = move
    return `${name(move)} were ${words.length(Math.abs(to - from))} ${to > from ? more : less}`
  },
})

/** "the room never fell below 20 °C" */
const stated = (
  path: string,
  say: (amount: string, isMore: boolean) => string,
  unit: Parameters<Printer['measure']>[1],
  only?: 'more' | 'less',
): Changeable => ({
  path,
  ...(only && { only }),
  say: ({ from, to }, words) => say(words.measure(to, unit), to > from),
})

const along = ['longer', 'shorter'] as const
const across = ['wider', 'narrower'] as const
const up = ['higher', 'lower'] as const
const down = ['deeper', 'shallower'] as const

const chamberOf = ({ path, plan: { tank } }: Move): string => {
  const [, , place, field = ''] = path.split('.')
  const name = `the ${tank.chambers[Number(place)]?.name ?? 'chamber'}`
  if (field.startsWith('opening')) return `the opening of ${name}`
  return field === 'waterDepthMm' ? `the water in ${name}` : name
}
const tank = () => 'the tank'
const sump = () => 'the sump'
const display = () => 'the display'
const support = ({ plan: { setup } }: Move) => (setup.support?.kind === 'furniture' ? 'the furniture' : 'the stand')
const least = (isMore: boolean) => (isMore ? 'at least' : 'at most')

export const changeables: readonly Changeable[] = [
  sized('tank.chambers.*.lengthMm', chamberOf, along),
  sized('tank.chambers.*.widthMm', chamberOf, across),
  sized('tank.chambers.*.waterDepthMm', chamberOf, down),
  sized('tank.chambers.*.heightMm', chamberOf, up),
  sized('tank.chambers.*.openingLengthMm', chamberOf, along),
  sized('tank.chambers.*.openingWidthMm', chamberOf, across),
  sized('tank.outerLengthMm', tank, along),
  sized('tank.outerWidthMm', tank, across),
  sized('tank.outerHeightMm', tank, up),
  sized('tank.displayLengthMm', display, along),
  sized('tank.displayWidthMm', display, across),
  sized('tank.waterLineMm', () => 'the water line', up),
  sized('tank.sump.lengthMm', sump, along),
  sized('tank.sump.widthMm', sump, across),
  sized('tank.sump.waterDepthMm', () => 'the water in the sump', down),
  sized('support.lengthMm', support, along),
  sized('support.widthMm', support, across),
  sized('room.tankTopMm', () => 'the tank’s top edge', up),
  sized('goals.sandDepthMm', () => 'the sand', down, {}),
  stated('room.coldestC', (amount) => `the room never fell below ${amount}`, 'C', 'more'),
  stated('room.warmestC', (amount) => `the room never rose above ${amount}`, 'C', 'less'),
  // Cooler water asks less of a heater; nobody warms it up because one is too strong.
  { ...stated('goals.temperatureC', (amount) => `the water were kept at ${amount}`, 'C', 'less'), isLivedIn: true },
  stated('goals.rockKg', (amount, isMore) => `there were ${least(isMore)} ${amount} of rock`, 'kg'),
  stated('goals.turnoverPerHour.0', (amount) => `a turnover of ${amount} were enough`, '/h', 'less'),
  stated('goals.turnoverPerHour.1', (amount) => `a turnover of up to ${amount} were wanted`, '/h', 'more'),
  {
    path: 'goals.switchedOutlets',
    only: 'less',
    say: ({ to }) => `you wanted no more than ${countOf(to, 'switched outlet')}`,
  },
  { path: 'mains.outlets', only: 'more', say: ({ to }) => `${countOf(to, 'wall outlet')} were free` },
  stated('mains.circuitA', (amount) => `the circuit were rated for at least ${amount}`, 'A', 'more'),
  stated('water.feedKPa', (amount) => `the tap gave at least ${amount}`, 'kPa', 'more'),
  stated('water.litresPerWeek', (amount) => `at most ${amount} of pure water were needed`, 'L/wk', 'less'),
]
