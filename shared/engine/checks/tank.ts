import type { Printer } from '../../units/print'
import { lacking, type Candidate, type Judgement, type KindRules, type Rule } from '../rule'
import { withItems, type Scene } from '../scene'
import type { Plan } from '../setup/plan'
import { resolve } from '../setup/resolve'
import { practiceBasis, thresholds } from '../thresholds'
import type { Piece } from '../types'
import { readGroup, readMeasure, readNumber, readText } from '../values'
import { beSure, doubt } from '../doubt'
import { probabilityWithin } from '../physics/conformance'
import { grossUses, hasAreas, hasRatedVolume, isVolumeStated, noAreas } from './shape'
import { isCarried, judgeFootprint, judgeLoad } from './tank-support'

const sizeKeys = ['outerLengthMm', 'outerWidthMm', 'outerHeightMm']
const insideKeys = [...sizeKeys, 'wallMm', 'waterLineMm']

const listMissingSize = ({ specs }: Piece): readonly string[] =>
  sizeKeys.filter((key) => readNumber(specs, key) === undefined)

/** Attributes that are not known of what the volume inside follows from. */
const listMissingInside = (piece: Piece): readonly string[] => [
  ...listMissingSize(piece),
  ...['wallMm', 'waterLineMm'].filter((key) => readNumber(piece.specs, key) === undefined),
]

/** The setup with this tank in it, or undefined where what it holds is not known. */
function planWith(scene: Scene, piece: Piece): Plan | undefined {
  if (listMissingInside(piece).length > 0) return undefined
  return resolve(
    withItems(scene.plan.setup, scene.others, { specs: piece.specs, ...(piece.gear && { gear: piece.gear }) }),
  )
}

const labels: Readonly<Record<string, string>> = {
  'rear-chambers': 'rear chambers',
  sump: 'a sump',
  'hang-on': 'a hang-on filter',
  none: 'none',
}

function judgeFiltration({ plan }: Scene, { piece }: Candidate): Judgement {
  const offered = readText(piece.specs, 'filtration')
  if (offered === undefined) return lacking(['filtration'], () => 'Nobody has recorded how it is filtered.')
  const wanted = plan.tank.filtration
  if (offered === wanted)
    return {
      outcome: 'pass',
      measured: offered,
      say: () => (offered === 'none' ? 'No filtration, as now.' : `Has ${labels[offered]}, as now.`),
    }
  if (wanted === 'none')
    return { outcome: 'pass', measured: offered, say: () => `Has ${labels[offered]}, where there was nothing.` }
  if (offered === 'none')
    return {
      outcome: 'fail',
      measured: offered,
      say: () => `Has no place for filtration; the setup uses ${labels[wanted]}.`,
    }
  return {
    outcome: 'change',
    measured: offered,
    asks: { need: `filtration-${offered}`, amount: null, unit: null },
    say: () =>
      `Made for ${labels[offered]}: buy what that takes; what stands in ${wanted === 'rear-chambers' ? 'the rear chambers' : wanted === 'sump' ? 'the sump' : 'the hang-on filter'} loses its place.`,
  }
}

function judgeVolume(scene: Scene, { piece }: Candidate): Judgement {
  const nominal = readMeasure(piece.specs, 'nominalVolumeL')
  const plan = nominal ? undefined : planWith(scene, piece)
  const offered = nominal?.value ?? (plan && hasAreas(plan) ? plan.tank.grossL : undefined)
  if (offered === undefined) return lacking(['nominalVolumeL'], () => 'Nobody has recorded its volume yet.')
  if (!hasRatedVolume(scene.plan)) return noAreas(scene.plan)
  const now = scene.plan.tank.ratedL
  const pass = thresholds.tankVolumePass.value
  const change = thresholds.tankVolumeChange.value
  const rounding = 1e-9
  const off = Math.abs(offered - now) / now - rounding
  const wording = (words: Printer) => `${words.volume(offered)} in place of ${words.volume(now)}`
  return {
    outcome: off <= pass ? 'pass' : off <= change ? 'change' : 'fail',
    measured: offered,
    limit: [now * (1 - pass), now * (1 + pass)],
    changeLimit: [now * (1 - change), now * (1 + change)],
    rests: () => (isVolumeStated(scene.plan) ? [] : grossUses),
    ...beSure(
      (u) => probabilityWithin(offered, now * (1 - pass), now * (1 + pass), u),
      () => [doubt(nominal ?? { value: offered, source: 'maker' }, 'other', 'check its volume')],
    ),
    say: (words) =>
      off <= pass
        ? `${wording(words)}: about the same.`
        : off <= change
          ? `${wording(words)}: salt, rock, heat and light have to follow.`
          : `${wording(words)}: that is another setup.`,
  }
}

function judgeReturnPump({ others }: Scene, { piece }: Candidate): Judgement {
  if (readGroup(piece.specs, 'includedPump')) return { outcome: 'pass', say: () => 'Comes with a return pump.' }
  const filtration = readText(piece.specs, 'filtration')
  if (filtration === 'none' || filtration === 'hang-on') return { outcome: 'pass', say: () => 'Needs no return pump.' }
  if (others.some((item) => item.piece.kind === 'return-pump'))
    return { outcome: 'pass', say: () => 'The setup has a return pump.' }
  if (filtration === undefined)
    return lacking(['filtration'], () => 'Nobody has recorded how it is filtered, or whether that takes a pump.')
  const bore = readNumber(piece.specs, 'returnBoreMm')
  return {
    outcome: 'change',
    asks: { need: 'return-pump', amount: null, unit: null },
    say: (words) =>
      `No return pump is stated to come with it: it needs one${bore === undefined ? '' : ` for a bore of ${words.length(bore)}`}.`,
  }
}

/** Where nothing that has to carry it is known, its weight is nobody's question. */
function judgeFilled(scene: Scene, candidate: Candidate): Judgement | null {
  const { piece } = candidate
  if (!isCarried(scene)) return null
  const missing = [
    ...listMissingInside(piece),
    ...(readNumber(piece.specs, 'dryMassKg') === undefined
      ? ['bottomMm', 'material'].filter((key) => piece.specs[key] === undefined)
      : []),
  ]
  const filled = planWith(scene, piece)
  if (!filled || missing.length > 0)
    return lacking(missing, () => 'Nobody has recorded all the sizes that its filled weight follows from.')
  return hasAreas(filled) ? judgeLoad(scene, filled) : noAreas(filled)
}

const rule = (check: string, parts: Omit<Rule, 'id' | 'basis'>, basis = practiceBasis): Rule => ({
  id: `tank.${check}`,
  basis,
  ...parts,
})

export const tankRules: KindRules = {
  rules: [
    rule('volume', {
      label: 'Volume',
      worst: 'fail',
      unit: 'L',
      rule: `Nominal volume, else inside size by water line, within ${thresholds.tankVolumePass.value * 100} % passes, within ${thresholds.tankVolumeChange.value * 100} % is a change.`,
      reads: ['nominalVolumeL', ...insideKeys, 'filtration', 'sump', 'shape'],
      uses: grossUses,
      failLabel: 'far larger or smaller',
      judge: judgeVolume,
    }),
    rule('filtration', {
      label: 'Filtration',
      worst: 'fail',
      unit: null,
      rule: 'The same style passes; another style is a change that names what must be bought; no filtration in place of some fails.',
      reads: ['filtration'],
      uses: ['tank.filtration'],
      failLabel: 'without a place for filtration',
      judge: judgeFiltration,
    }),
    rule('return-pump', {
      label: 'Return pump',
      worst: 'change',
      unit: null,
      rule: 'Included, in the setup, or not needed passes; otherwise one has to be bought for its bore.',
      reads: ['includedPump', 'filtration', 'returnBoreMm'],
      uses: [],
      failLabel: 'without a return pump',
      judge: judgeReturnPump,
    }),
    rule('support', {
      label: 'Footprint on its stand',
      worst: 'fail',
      unit: 'mm',
      rule: 'Length and width each within the top of the setup’s stand or furniture, turned by 90° if need be.',
      reads: ['outerLengthMm', 'outerWidthMm'],
      uses: [],
      failLabel: 'too large for the stand',
      judge: judgeFootprint,
    }),
    rule(
      'support-load',
      {
        label: 'Filled weight on its stand',
        worst: 'fail',
        unit: 'kg',
        rule: 'The stand’s rating is at least the filled weight: shell, water, rock and sand. Without a rating, what its maker says it is made for. On furniture the weight is information.',
        readsGear: true,
        reads: [
          ...insideKeys,
          'bottomMm',
          'material',
          'dryMassKg',
          'shape',
          'displayLengthMm',
          'displayWidthMm',
          'chambers',
          'filtration',
          'sump',
        ],
        uses: ['goals.rockKg', 'goals.sandDepthMm', 'goals.salinityPpt', 'goals.temperatureC'],
        failLabel: 'too heavy for the stand',
        judge: judgeFilled,
      },
      {
        type: 'physics',
        source:
          'Shell by density (EN 572-1 glass, ISO 10456 acrylic), sea water by EOS-80 (UNESCO Technical Papers in Marine Science 44)',
      },
    ),
  ],
  targetReads: ['nominalVolumeL', ...insideKeys, 'filtration', 'sump'],
  target: (scene, { piece }) => {
    const offered = readNumber(piece.specs, 'nominalVolumeL') ?? planWith(scene, piece)?.tank.grossL
    return offered === undefined ? null : Math.abs(offered - scene.plan.tank.ratedL) / scene.plan.tank.ratedL
  },
}
