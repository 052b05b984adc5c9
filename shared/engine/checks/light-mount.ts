import { lacking, type Candidate, type Judgement, type KindRules, type Rule } from '../rule'
import type { Scene } from '../scene'
import { practiceBasis } from '../thresholds'
import type { Item } from '../types'
import { readMeasure, readNumber, readSet, readText } from '../values'
import { beSure, doubt } from '../doubt'
import { probabilityAtLeast, probabilityWithin } from '../physics/conformance'
import { sayUncounted } from '../counting'
import { limitsOfMount, mountNames, mountRests, suits } from './light-mounts'

const lightsOf = ({ others }: Scene): readonly Item[] => others.filter((item) => item.piece.kind === 'light')

const noLight: Judgement = {
  outcome: 'nodata',
  missing: [],
  say: () => 'There is no light in the setup to hold it against.',
}

function judgeLamp(scene: Scene, { piece }: Candidate): Judgement {
  const type = readText(piece.specs, 'type')
  if (type === undefined) return lacking(['type'], () => 'Nobody has recorded what sort of mount it is.')
  const lights = lightsOf(scene)
  if (lights.length === 0) return noLight
  const setsOf = ({ piece: { specs } }: Item) =>
    ['mountsIncluded', 'mountsPossible'].map((key) => readSet<string>(specs, key))
  const takes = lights.some((item) => setsOf(item).some((mounts) => mounts?.includes(type)))
  if (!takes && lights.some((item) => setsOf(item).includes(undefined)))
    return { outcome: 'nodata', missing: [], say: () => 'Nobody has recorded all the mounts that the light takes.' }
  return {
    outcome: takes ? 'pass' : 'fail',
    measured: type,
    say: () => (takes ? `The light takes ${mountNames[type]}.` : `The light does not take ${mountNames[type]}.`),
  }
}

function judgeLoad(scene: Scene, { piece }: Candidate): Judgement {
  const load = readMeasure(piece.specs, 'maxLoadKg')
  if (!load) return lacking(['maxLoadKg'], () => 'Nobody has recorded the load it carries.')
  const lights = lightsOf(scene)
  const masses = lights.flatMap((item) => readNumber(item.piece.specs, 'massKg') ?? [])
  if (lights.length === 0) return noLight
  if (masses.length < lights.length)
    return { outcome: 'nodata', missing: [], say: () => 'Nobody has recorded what the light weighs.' }
  const heaviest = Math.max(...masses)
  return {
    outcome: load.value >= heaviest ? 'pass' : 'fail',
    measured: load.value,
    limit: heaviest,
    ...beSure(
      (u) => probabilityAtLeast(load.value, heaviest, u),
      () => [doubt(load, 'other', 'check the load it carries')],
    ),
    say: (words) => {
      const [carried, weight] = words.apart(load.value, heaviest, 'kg')
      return `Carries ${carried}, and the light weighs ${weight}.`
    },
  }
}

/** What a mount has to suit, and its own range where both ends are known; of a tank the side that is nearer to it. */
function measureMount(
  { plan: { tank, room } }: Scene,
  type: string,
  { rimMinMm, rimMaxMm, spanMinMm, spanMaxMm }: ReturnType<typeof limitsOfMount>,
): Partial<Judgement> {
  if (type !== 'arm' && type !== 'rim-legs') return { measured: room.ceilingMm }
  const [min, max] = type === 'arm' ? [rimMinMm, rimMaxMm] : [spanMinMm, spanMaxMm]
  const sides = type === 'arm' ? [tank.wallMm] : [tank.outerLengthMm, tank.outerWidthMm]
  if (min === undefined || max === undefined || min > max) return { measured: sides[0] ?? null }
  const miss = (side: number) => Math.max(min - side, side - max)
  const measured = sides.reduce((best, side) => (miss(side) < miss(best) ? side : best))
  const { source } = tank
  const ofSide = () =>
    type === 'arm'
      ? doubt({ value: measured, source }, 'other', 'measure the wall')
      : doubt({ value: measured, source }, 'length', 'measure the tank')
  const sureness = beSure(
    (u) => probabilityWithin(measured, min, max, u),
    () => [ofSide()],
  )
  return { measured, limit: [min, max], ...sureness }
}

function judgeTank(scene: Scene, { piece }: Candidate): Judgement {
  const type = readText(piece.specs, 'type')
  if (type === undefined) return lacking(['type'], () => 'Nobody has recorded what sort of mount it is.')
  if (type === 'canopy')
    return { outcome: 'nodata', missing: [], say: () => 'Whether a canopy goes over this tank cannot be checked here.' }
  const lights = lightsOf(scene)
  const heights = lights.flatMap((item) => readNumber(item.piece.specs, 'heightMm') ?? [])
  const found = suits(scene, type, limitsOfMount(piece.specs), Math.max(0, ...heights))
  if (found === undefined) {
    const keys = type === 'arm' ? ['rimMinMm', 'rimMaxMm'] : ['spanMinMm', 'spanMaxMm']
    const missing = keys.filter((key) => readNumber(piece.specs, key) === undefined)
    return lacking(missing, () => `Nobody has recorded the ${type === 'arm' ? 'rims' : 'spans'} that it fits.`)
  }
  const { tank } = scene.plan
  const isHung = type === 'hanging' || type === 'ceiling'
  const unknown = isHung ? lights.length - heights.length : 0
  return {
    rests: () => mountRests[type] ?? [],
    cautions: unknown > 0 ? [sayUncounted(unknown, 'height')] : [],
    outcome: found ? 'pass' : 'fail',
    ...measureMount(scene, type, limitsOfMount(piece.specs)),
    say: (words) => {
      if (type === 'arm')
        return found
          ? `Clamps the ${words.length(tank.wallMm)} wall.`
          : `Its clamp does not fit walls of ${words.length(tank.wallMm)}.`
      if (type === 'rim-legs')
        return found ? 'Its legs span the tank.' : 'Its legs span neither the tank’s length nor its width.'
      return found ? 'There is height for it under the ceiling.' : 'There is no height for it under the ceiling.'
    },
  }
}

const rule = (check: string, parts: Omit<Rule, 'id' | 'basis' | 'worst'>): Rule => ({
  id: `light-mount.${check}`,
  basis: practiceBasis,
  worst: 'fail',
  ...parts,
})

export const lightMountRules: KindRules = {
  rules: [
    rule('lamp', {
      label: 'Fits the light',
      unit: null,
      rule: 'Of a sort that the setup’s light takes, included or sold apart.',
      reads: ['type'],
      uses: [],
      failLabel: 'not made for the light',
      judge: judgeLamp,
    }),
    rule('load', {
      label: 'Carries the light',
      unit: 'kg',
      limitIs: 'least',
      rule: 'Its greatest load is at least the mass of the light.',
      reads: ['maxLoadKg'],
      uses: [],
      failLabel: 'too weak for the light',
      judge: judgeLoad,
    }),
    rule('tank', {
      label: 'Fits the tank',
      unit: 'mm',
      rule: 'Clamp around the wall, legs across the length or width, or height under the ceiling.',
      reads: ['type', 'rimMinMm', 'rimMaxMm', 'spanMinMm', 'spanMaxMm'],
      uses: [...new Set(Object.values(mountRests).flat())],
      failLabel: 'not made for this tank',
      judge: judgeTank,
    }),
  ],
  feltThrough: ['type', 'rimMinMm', 'rimMaxMm', 'spanMinMm', 'spanMaxMm'],
}
