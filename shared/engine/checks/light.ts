import { lacking, type Candidate, type Judgement, type KindRules, type Rule } from '../rule'
import type { Scene } from '../scene'
import { practiceBasis, thresholds } from '../thresholds'
import { isWithinMm, readGroups, readMeasure, readSet, readText } from '../values'
import { beSure, doubt } from '../doubt'
import { probabilityAtLeast, probabilityAtMost } from '../physics/conformance'
import { lightCoverage, lightIntensity, lightTargetReads, rankLight } from './light-beam'
import { judgeMount, mountRests } from './light-mounts'
import { findTankSize } from './tank-size'

const hangs = ['hanging', 'ceiling']

function judgeBody({ plan }: Scene, { piece }: Candidate): Judgement {
  const length = readMeasure(piece.specs, 'lengthMm')
  if (!length) return lacking(['lengthMm'], () => 'Nobody has recorded its length yet.')
  const tankMm = plan.tank.outerLengthMm
  const limitMm = tankMm + thresholds.lightOverTankMm.value
  const mountKeys = ['mountsIncluded', 'mountsPossible']
  const canHang = mountKeys.some((key) => readSet<string>(piece.specs, key)?.some((mount) => hangs.includes(mount)))
  const isUnrecorded = mountKeys.some((key) => piece.specs[key] === undefined)
  const base = {
    measured: length.value,
    limit: limitMm,
    ...beSure(
      (u) => probabilityAtMost(length.value, limitMm, u),
      () => [
        doubt(length, 'length', 'check its length'),
        doubt(findTankSize(plan, 'outerLengthMm'), 'length', 'measure the tank'),
      ],
    ),
  }
  if (isWithinMm(length.value, limitMm))
    return {
      ...base,
      outcome: 'pass',
      say: (words) => `${words.length(length.value)} long over ${words.length(tankMm)} of tank.`,
    }
  const over = length.value - tankMm
  const isShortEnough = isWithinMm(length.value, thresholds.lightHungRatio.value * tankMm)
  if (canHang && isShortEnough)
    return { ...base, outcome: 'change', say: (words) => `It is ${words.length(over)} longer than the tank: hang it.` }
  if (isUnrecorded && isShortEnough)
    return lacking(
      mountKeys.filter((key) => piece.specs[key] === undefined),
      (words) =>
        `It is ${words.length(over)} longer than the tank, and nobody has recorded whether it can hang above it.`,
    )
  return { ...base, outcome: 'fail', say: (words) => `It is ${words.length(over)} longer than the tank.` }
}

interface Band {
  readonly fromNm: number
  readonly toNm: number
  readonly share: number
}

/** Share of photons from 400 to 500 nm, bands prorated by wavelength. */
export function findBlueShare(bands: readonly Band[]): number {
  return bands.reduce((sum, { fromNm, toNm, share }) => {
    const inside = Math.min(toNm, 500) - Math.max(fromNm, 400)
    return inside <= 0 ? sum : sum + (toNm > fromNm ? (share * inside) / (toNm - fromNm) : share)
  }, 0)
}

function judgeSpectrum(_scene: Scene, { piece }: Candidate): Judgement {
  const bands = readGroups<Band>(piece.specs, 'bands')
  if (!bands || bands.length === 0)
    return {
      ...lacking(['bands'], () => 'Nobody has recorded its spectrum.'),
      cautions: [() => 'Its spectrum is not recorded: ask for a plot before keeping corals under it.'],
    }
  const share = findBlueShare(bands)
  const isBlue = share + 1e-9 >= thresholds.blueShare.value
  return {
    outcome: isBlue ? 'pass' : 'change',
    measured: share,
    limit: thresholds.blueShare.value,
    ...beSure(
      (u) => probabilityAtLeast(share, thresholds.blueShare.value, u),
      () => [
        doubt(
          { value: share, source: piece.specs['bands']?.source ?? 'estimate' },
          'other',
          'ask for a plot of its spectrum',
        ),
      ],
    ),
    say: () => `${Math.round(share * 100)} % of its photons are blue${isBlue ? '' : ': warmer than corals prefer'}.`,
  }
}

function judgeControl(scene: Scene, { piece }: Candidate): Judgement | null {
  if (!scene.plan.goals.appControl) return null
  const control = readText(piece.specs, 'control')
  if (control === undefined) return lacking(['control'], () => 'Nobody has recorded how it is controlled.')
  if (control === 'app-built-in')
    return { outcome: 'pass', measured: control, say: () => 'Set by app without anything else.' }
  if (control !== 'controller-needed')
    return { outcome: 'change', measured: control, say: () => 'Cannot be set by app.' }
  const group = readText(piece.specs, 'controlGroup')
  const controllers = scene.others
    .filter((item) => item.piece.kind === 'light-controller')
    .map((item) => readText(item.piece.specs, 'controlGroup'))
  if (group !== undefined && controllers.includes(group))
    return { outcome: 'pass', measured: control, say: () => 'The light controller in the setup speaks to it.' }
  if (group === undefined && controllers.length > 0)
    return lacking(['controlGroup'], () => 'Nobody has recorded which controllers it listens to.')
  if (controllers.includes(undefined))
    return {
      outcome: 'nodata',
      missing: [],
      say: () => 'Nobody has recorded which lights the light controller speaks to.',
    }
  return {
    outcome: 'change',
    measured: control,
    asks: { need: 'light-control', amount: null, unit: null },
    say: () => `Set by app only with a controller${group === undefined ? '' : ` of the ${group} group`}.`,
  }
}

const rule = (check: string, parts: Omit<Rule, 'id' | 'basis'>): Rule => ({
  id: `light.${check}`,
  basis: practiceBasis,
  ...parts,
})

export const lightRules: KindRules = {
  rules: [
    lightCoverage,
    lightIntensity,
    rule('body', {
      label: 'Length over the tank',
      worst: 'fail',
      unit: 'mm',
      rule: `No longer than the tank and ${thresholds.lightOverTankMm.value} mm; hung, up to ${thresholds.lightHungRatio.value} times the tank.`,
      reads: ['lengthMm', 'mountsIncluded', 'mountsPossible'],
      uses: ['tank.outerLengthMm'],
      failLabel: 'too long for the tank',
      judge: judgeBody,
    }),
    rule('spectrum', {
      label: 'Spectrum',
      worst: 'change',
      unit: 'fraction',
      limitIs: 'least',
      rule: `At least ${thresholds.blueShare.value * 100} % of its photons between 400 and 500 nm.`,
      reads: ['bands'],
      uses: [],
      failLabel: 'too warm',
      judge: judgeSpectrum,
    }),
    rule('mount', {
      label: 'Mount',
      worst: 'change',
      unit: null,
      rule: 'A mount that comes with it, or is in the setup, suits the tank’s rim, its length or width, or the ceiling; one sold apart is a change.',
      reads: [
        'mountsIncluded',
        'mountsPossible',
        'armRimMinMm',
        'armRimMaxMm',
        'legSpanMinMm',
        'legSpanMaxMm',
        'heightMm',
      ],
      uses: [...new Set(Object.values(mountRests).flat())],
      failLabel: 'without a mount',
      judge: judgeMount,
    }),
    rule('control', {
      label: 'Control',
      worst: 'change',
      unit: null,
      rule: 'Judged only where control by app is wanted: built in passes, a controller of its group is a change unless one is there.',
      reads: ['control', 'controlGroup'],
      uses: ['goals.appControl'],
      failLabel: 'without control by app',
      judge: judgeControl,
    }),
  ],
  target: rankLight,
  targetReads: lightTargetReads,
  feltThrough: ['powerW', 'plugs', 'massKg', 'heightMm', 'controlGroup', 'control', 'mountsPossible', 'mountsIncluded'],
}
