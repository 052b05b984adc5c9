import { lacking, type Candidate, type Judgement, type KindRules, type Rule, type Say } from '../rule'
import { type Scene } from '../scene'
import { beSure, doubt, doubtTank } from '../doubt'
import { probabilityReaches, probabilityWithin } from '../physics/conformance'
import type { Basin } from '../setup/places'
import { practiceBasis, thresholds } from '../thresholds'
import type { Value } from '../types'
import { readFlag, readMeasure, readNumber } from '../values'
import { bodyUses, judgeBody, lackWater } from './body-judgement'
import { chooseBasin, tryBody, type BodyFit } from './body-space'
import { chooseBands, findCurveFault, findPumpBasins, findTurnover, readCurve, type Turnover } from './pump-flow'
import { hasAreas, noAreas, waterUses } from './shape'

/** The roomiest place for the pump, or what its size lacks. */
function place(scene: Scene, candidate: Candidate): BodyFit | readonly string[] | undefined {
  const { specs } = candidate.piece
  const [length, width, height] = ['lengthMm', 'widthMm', 'heightMm'].map((key) => readMeasure(specs, key))
  if (!length || !width || !height)
    return ['lengthMm', 'widthMm', 'heightMm'].filter((key) => readNumber(specs, key) === undefined)
  const depth: Value<number> = readMeasure(specs, 'minDepthMm') ?? {
    ...height,
    value: height.value + thresholds.pumpCoverMm.value,
  }
  const body = {
    length,
    width,
    height,
    depth,
    clearanceMm: thresholds.pumpClearanceMm.value,
    quantity: candidate.quantity,
  }
  return chooseBasin(findPumpBasins(scene, candidate).map((basin) => tryBody(body, basin, scene.others)))
}

const isFit = (found: BodyFit | readonly string[] | undefined): found is BodyFit =>
  found !== undefined && 'basin' in found

/** The water that the pump is judged in: where it fits best, else where it would go; undefined where there is none. */
export function choosePumpBasin(scene: Scene, candidate: Candidate): Basin | undefined {
  const found = place(scene, candidate)
  return isFit(found) ? found.basin : findPumpBasins(scene, candidate)[0]
}

function judgeSpace(scene: Scene, candidate: Candidate): Judgement {
  const found = place(scene, candidate)
  if (found === undefined) return lackWater(candidate.place)
  if (!isFit(found)) return lacking(found, () => 'Nobody has recorded its outside size yet.')
  return judgeBody(found, scene.plan)
}

type Bands = ReturnType<typeof chooseBands>

/** The turnover to judge by: as much of the wanted band as the speed control reaches. */
function findJudged({ perHour, slowestPerHour }: Turnover, { pass }: Bands, isControlled: boolean): number {
  return isControlled && perHour > pass[1] ? Math.max(slowestPerHour, pass[1]) : perHour
}

const isWithin = (value: number, [low, high]: readonly [number, number]) => value >= low && value <= high

const decide = (judged: number, { pass, change }: Bands) =>
  isWithin(judged, pass) ? 'pass' : isWithin(judged, change) ? 'change' : 'fail'

const sayTurnover =
  (turnover: Turnover, judged: number, bands: Bands): Say =>
  (words) => {
    const { perHour, point } = turnover
    const [low, high] = bands.pass.map((value) => words.number(value, '/h'))
    const wanted = `${low} to ${high} are wanted`
    const against = point.headM > 0 ? ` against ${words.measure(point.headM, 'm')} of head` : ''
    const flow = `${words.flow(point.flowLph)}${against}, ${words.number(perHour, '/h')} times the tank’s water an hour`
    const outcome = decide(judged, bands)
    if (outcome === 'pass')
      return judged < perHour
        ? `${flow}; its speed control brings that down to the ${low} to ${high} that are wanted.`
        : `${flow}.`
    if (judged < bands.pass[0]) return `${outcome === 'change' ? 'Low' : 'Too weak'}: ${flow}; ${wanted}.`
    const slowest = judged < perHour ? `, and still ${words.number(judged, '/h')} at its slowest` : ''
    return `${outcome === 'change' ? 'Throttle it' : 'Far too strong'}: ${flow}${slowest}; ${wanted}.`
  }

function judgeFlow(scene: Scene, candidate: Candidate): Judgement {
  const { specs } = candidate.piece
  const fault = findCurveFault(specs)
  if (fault !== undefined) return lacking(['flowCurve'], () => `Its flow curve cannot be right: ${fault}.`)
  if (!readCurve(specs)) return lacking(['flowCurve'], () => 'Nobody has recorded how its flow falls with height yet.')
  const basin = choosePumpBasin(scene, candidate)
  if (!basin) return lackWater(candidate.place)
  if (!hasAreas(scene.plan)) return noAreas(scene.plan)
  const bands = chooseBands(scene)
  const judgeAs = (isControlled: boolean): Judgement | null => {
    const turnover = findTurnover(scene, candidate, basin, isControlled)
    if (!turnover) return null
    const judged = findJudged(turnover, bands, isControlled)
    const say = sayTurnover(turnover, judged, bands)
    const { tank } = scene.plan
    const sureness = beSure(
      (u) => probabilityReaches([turnover.slowestPerHour, turnover.perHour], bands.pass[0], bands.pass[1], u),
      () => [
        doubt(
          { value: judged, source: specs['flowCurve']?.source ?? 'estimate' },
          'other',
          'have its flow measured at that height',
        ),
        doubtTank(judged, tank),
      ],
    )
    return {
      outcome: decide(judged, bands),
      measured: judged,
      limit: bands.pass,
      changeLimit: bands.change,
      say,
      ...sureness,
    }
  }
  const isControlled = readFlag(specs, 'dcControl')
  const plain = judgeAs(isControlled ?? false)
  if (!plain) return lacking(['flowCurve'], () => 'Its flow curve has too few points.')
  if (isControlled !== undefined || judgeAs(true)?.outcome === plain.outcome) return plain
  return lacking(
    ['dcControl'],
    (words) => `${plain.say(words)} Nobody has recorded whether its speed can be set lower.`,
  )
}

function judgeBore({ plan }: Scene, { piece }: Candidate): Judgement | null {
  const built = plan.tank.returnBoreMm
  if (built === undefined) return null
  const own = readMeasure(piece.specs, 'boreMm')
  if (!own) return lacking(['boreMm'], () => 'Nobody has recorded its bore yet.')
  const bore = own.value
  const isSame = Math.abs(bore - built) <= thresholds.pumpBoreMm.value
  return {
    outcome: isSame ? 'pass' : 'change',
    measured: bore,
    limit: [built - thresholds.pumpBoreMm.value, built + thresholds.pumpBoreMm.value],
    // Bores come in sizes, as panes do: a share of the bore, not the ± 3 mm of a length.
    ...beSure(
      (u) => probabilityWithin(bore, built - thresholds.pumpBoreMm.value, built + thresholds.pumpBoreMm.value, u),
      () => [doubt(own, 'other', 'check its bore')],
    ),
    ...(!isSame && { asks: { need: 'hose-adaptor', amount: null, unit: null, lacks: [`${bore}`] } }),
    say: (words) =>
      isSame
        ? `Its ${words.length(bore)} bore takes the tank’s hose.`
        : `Its bore is ${words.length(bore)}, the tank’s ${words.length(built)}: needs an adaptor.`,
  }
}

const bodyReads = ['lengthMm', 'widthMm', 'heightMm', 'minDepthMm']

const rule = (check: string, parts: Omit<Rule, 'id' | 'basis'>, basis = practiceBasis): Rule => ({
  id: `return-pump.${check}`,
  basis,
  ...parts,
})

export const returnPumpRules: KindRules = {
  rules: [
    rule(
      'flow',
      {
        label: 'Turnover',
        worst: 'fail',
        unit: '/h',
        rule: 'Flow where the pump’s curve meets what lift and pipe take, by the hour and the water: rear chambers 4 to 12 times, with a change 3 to 16; a sump 3 to 10, with a change 2 to 15; a goal that was given takes their place. With speed control it is throttled to as little as 40 %.',
        reads: ['flowCurve', 'boreMm', 'dcControl', ...bodyReads],
        uses: [
          'goals.turnoverPerHour',
          'room.tankTopMm',
          'tank.chambers.*.waterDepthMm',
          ...waterUses,
          'tank.bottomMm',
        ],
        failLabel: 'too weak or far too strong',
        judge: judgeFlow,
      },
      {
        type: 'physics',
        source:
          'Darcy–Weisbach with Swamee & Jain 1976; fittings by Flow of Fluids, TP-410M; affinity laws. The bands are common practice',
      },
    ),
    rule('space', {
      label: 'Room for the pump',
      worst: 'fail',
      unit: 'mm',
      rule: `Its body in the chamber with what else is there, ${thresholds.pumpClearanceMm.value} mm to each side, and under the water its maker asks for, else ${thresholds.pumpCoverMm.value} mm above it.`,
      reads: bodyReads,
      uses: bodyUses,
      failLabel: 'too large for the place',
      judge: judgeSpace,
    }),
    rule('bore', {
      label: 'Bore',
      worst: 'change',
      unit: 'mm',
      rule: `Within ${thresholds.pumpBoreMm.value} mm of the tank’s return, where that is known; else an adaptor.`,
      reads: ['boreMm'],
      uses: [],
      failLabel: 'of another bore',
      judge: judgeBore,
    }),
  ],
  targetReads: ['flowCurve', 'boreMm', 'dcControl', ...bodyReads],
  target: (scene, candidate) => {
    const basin = choosePumpBasin(scene, candidate)
    const isControlled = readFlag(candidate.piece.specs, 'dcControl') ?? false
    const turnover = basin ? findTurnover(scene, candidate, basin, isControlled) : null
    if (!turnover) return null
    const { pass } = chooseBands(scene)
    const middle = (pass[0] + pass[1]) / 2
    return Math.abs(Math.max(turnover.slowestPerHour, Math.min(turnover.perHour, middle)) - middle) / middle
  },
}
