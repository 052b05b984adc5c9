import { lacking, type Candidate, type Judgement, type KindRules, type Rule } from '../rule'
import { type Scene } from '../scene'
import { practiceBasis, thresholds } from '../thresholds'
import type { Value } from '../types'
import { readFlag, readMeasure, readNumber } from '../values'
import { chooseBasin, describeBody, listBodySizes, tryBody, type BodyFit } from './body-space'
import { chooseBands, findPumpBasins, findTurnover, readCurve } from './pump-flow'

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

function judgeSpace(scene: Scene, candidate: Candidate): Judgement {
  const found = place(scene, candidate)
  if (found === undefined) return { outcome: 'fail', say: () => 'The setup has no such chamber.' }
  if (!isFit(found)) return lacking(found, () => 'Nobody has recorded its outside size yet.')
  const cautions = found.basin.id === 'display' ? [() => 'No chamber or sump for it: it stands in the display.'] : []
  return {
    outcome: found.fits ? 'pass' : 'fail',
    measured: found.measuredMm,
    limit: found.limitMm,
    probability: found.probability,
    ...(found.fits && { placement: { chamber: found.basin.id, position: 'upright' as const, angleDeg: 90 } }),
    rests: () => listBodySizes(found),
    cautions,
    say: describeBody(found),
  }
}

function judgeFlow(scene: Scene, candidate: Candidate): Judgement {
  const { specs } = candidate.piece
  if (!readCurve(specs)) return lacking(['flowCurve'], () => 'Nobody has recorded how its flow falls with height yet.')
  const found = place(scene, candidate)
  const basin = isFit(found) ? found.basin : findPumpBasins(scene, candidate)[0]
  const isControlled = readFlag(specs, 'dcControl') ?? false
  const turnover = basin && findTurnover(scene, candidate, basin, isControlled)
  if (!turnover) return { outcome: 'fail', say: () => 'The setup has no such chamber.' }
  const { pass, change } = chooseBands(scene)
  const { perHour, slowestPerHour, point } = turnover
  const isThrottled = perHour > pass[1] && isControlled
  const judged = isThrottled ? Math.max(slowestPerHour, Math.min(perHour, pass[1])) : perHour
  const outcome =
    judged >= pass[0] && judged <= pass[1] ? 'pass' : judged >= change[0] && judged <= change[1] ? 'change' : 'fail'
  return {
    outcome,
    measured: judged,
    limit: pass,
    say: (words) => {
      const [low, high] = pass.map((value) => words.number(value, '/h'))
      const flow = `${words.flow(point.flowLph)} against ${words.measure(point.headM, 'm')} of head, ${words.number(perHour, '/h')} times the water an hour`
      if (outcome === 'pass')
        return isThrottled
          ? `${flow} at full speed; its speed control brings it down to what is wanted, ${low} to ${high}.`
          : `${flow}.`
      const wanted = `${low} to ${high} are wanted`
      if (judged < pass[0]) return outcome === 'change' ? `Low: ${flow}; ${wanted}.` : `Too weak: ${flow}; ${wanted}.`
      return outcome === 'change' ? `Throttle it: ${flow}; ${wanted}.` : `Far too strong: ${flow}; ${wanted}.`
    },
  }
}

function judgeBore({ plan }: Scene, { piece }: Candidate): Judgement | null {
  const built = plan.tank.returnBoreMm
  if (built === undefined) return null
  const bore = readNumber(piece.specs, 'boreMm')
  if (bore === undefined) return lacking(['boreMm'], () => 'Nobody has recorded its bore yet.')
  const isSame = Math.abs(bore - built) <= thresholds.pumpBoreMm.value
  return {
    outcome: isSame ? 'pass' : 'change',
    measured: bore,
    limit: [built - thresholds.pumpBoreMm.value, built + thresholds.pumpBoreMm.value],
    ...(!isSame && { asks: { need: 'hose-adaptor', amount: null, unit: null } }),
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
          'tank.waterLineMm',
          'tank.outerHeightMm',
          'tank.sump.waterDepthMm',
          'tank.chambers.*.waterDepthMm',
          'tank.outerLengthMm',
          'tank.outerWidthMm',
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
      uses: [
        'tank.chambers.*.lengthMm',
        'tank.chambers.*.widthMm',
        'tank.chambers.*.waterDepthMm',
        'tank.sump.lengthMm',
        'tank.sump.widthMm',
        'tank.sump.waterDepthMm',
        'tank.displayLengthMm',
        'tank.displayWidthMm',
        'tank.waterLineMm',
      ],
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
    const found = place(scene, candidate)
    const basin = isFit(found) ? found.basin : findPumpBasins(scene, candidate)[0]
    const isControlled = readFlag(candidate.piece.specs, 'dcControl') ?? false
    const turnover = basin ? findTurnover(scene, candidate, basin, isControlled) : null
    if (!turnover) return null
    const { pass } = chooseBands(scene)
    const middle = (pass[0] + pass[1]) / 2
    return Math.abs(Math.max(turnover.slowestPerHour, Math.min(turnover.perHour, middle)) - middle) / middle
  },
}
