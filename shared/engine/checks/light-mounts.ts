import { joinNames } from '../counting'
import { lacking, type Candidate, type Judgement } from '../rule'
import type { Scene } from '../scene'
import { defaults } from '../setup/defaults'
import type { Specs } from '../types'
import { isWithinMm, readNumber, readSet, readText } from '../values'

type Mount = 'arm' | 'rim-legs' | 'hanging' | 'ceiling' | 'canopy'

export const mountNames: Readonly<Record<string, string>> = {
  arm: 'an arm on the rim',
  'rim-legs': 'legs on the rim',
  hanging: 'a hanging kit',
  ceiling: 'a ceiling mount',
  canopy: 'a canopy',
}

const ceilingRests = ['room.ceilingMm', 'room.tankTopMm', 'tank.outerHeightMm']

/** Setup paths that it rests on whether a mount of a sort suits. */
export const mountRests: Readonly<Record<string, readonly string[]>> = {
  arm: ['tank.wallMm'],
  'rim-legs': ['tank.outerLengthMm', 'tank.outerWidthMm'],
  hanging: ceilingRests,
  ceiling: ceilingRests,
}

interface Limits {
  readonly rimMinMm: number | undefined
  readonly rimMaxMm: number | undefined
  readonly spanMinMm: number | undefined
  readonly spanMaxMm: number | undefined
}

/** Whether a mount of that type suits the tank and room; undefined where its limits are not known. */
export function suits(
  { plan }: Scene,
  type: string,
  limits: Limits,
  lampHeightMm: number | undefined,
  lensMm: number = defaults.mountHeightMm,
): boolean | undefined {
  const { tank, room } = plan
  const within = (value: number, min: number | undefined, max: number | undefined): boolean | undefined => {
    if ((min !== undefined && !isWithinMm(min, value)) || (max !== undefined && !isWithinMm(value, max))) return false
    return min === undefined || max === undefined ? undefined : true
  }
  if (type === 'arm') return within(tank.wallMm, limits.rimMinMm, limits.rimMaxMm)
  if (type === 'rim-legs') {
    const along = within(tank.outerLengthMm, limits.spanMinMm, limits.spanMaxMm)
    const across = within(tank.outerWidthMm, limits.spanMinMm, limits.spanMaxMm)
    return along === true || across === true ? true : along === undefined || across === undefined ? undefined : false
  }
  if (type === 'canopy') return undefined
  const isUnderCeiling = isWithinMm(room.tankTopMm + lensMm + (lampHeightMm ?? 0), room.ceilingMm)
  return isUnderCeiling && lampHeightMm === undefined ? undefined : isUnderCeiling
}

const limitsOfLight = (specs: Specs): Limits => ({
  rimMinMm: readNumber(specs, 'armRimMinMm'),
  rimMaxMm: readNumber(specs, 'armRimMaxMm'),
  spanMinMm: readNumber(specs, 'legSpanMinMm'),
  spanMaxMm: readNumber(specs, 'legSpanMaxMm'),
})

export const limitsOfMount = (specs: Specs): Limits => ({
  rimMinMm: readNumber(specs, 'rimMinMm'),
  rimMaxMm: readNumber(specs, 'rimMaxMm'),
  spanMinMm: readNumber(specs, 'spanMinMm'),
  spanMaxMm: readNumber(specs, 'spanMaxMm'),
})

const listNames = (types: readonly string[]) =>
  joinNames(
    types.map((type) => mountNames[type] ?? type),
    'or',
  )

/** What has to be known to tell whether a mount of a sort suits. */
const missingFor: Readonly<Record<string, readonly string[]>> = {
  arm: ['armRimMinMm', 'armRimMaxMm'],
  'rim-legs': ['legSpanMinMm', 'legSpanMaxMm'],
  hanging: ['heightMm'],
  ceiling: ['heightMm'],
}

/** Whether a mount that comes with the light, stands in the setup, or can be bought suits the tank. */
export function judgeMount(scene: Scene, { piece, mountHeightMm }: Candidate): Judgement {
  const { specs } = piece
  const included = readSet<Mount>(specs, 'mountsIncluded')
  const possible = readSet<Mount>(specs, 'mountsPossible')
  if (!included && !possible)
    return lacking(['mountsIncluded', 'mountsPossible'], () => 'Nobody has recorded how it is mounted.')
  const lampHeightMm = readNumber(specs, 'heightMm')
  const check = (type: string, limits: Limits) => suits(scene, type, limits, lampHeightMm, mountHeightMm)
  const own = (included ?? []).map((type) => ({ type, suits: check(type, limitsOfLight(specs)) }))
  const suiting = own.find((mount) => mount.suits)
  if (suiting)
    return {
      outcome: 'pass',
      measured: included ?? [],
      say: () => `Suits the tank with what it comes with: ${mountNames[suiting.type]}.`,
    }
  const sold: readonly string[] = possible ?? []
  const there = scene.others.find(
    (item) =>
      item.piece.kind === 'light-mount' &&
      sold.includes(readText(item.piece.specs, 'type') ?? '') &&
      check(readText(item.piece.specs, 'type') ?? '', limitsOfMount(item.piece.specs)),
  )
  if (there) return { outcome: 'pass', measured: sold, say: () => 'The light mount in the setup holds it.' }
  const [unclear] = own.filter((mount) => mount.suits === undefined)
  if (unclear) {
    const missing = (missingFor[unclear.type] ?? []).filter((key) => specs[key] === undefined)
    return lacking(missing, () => `Comes with ${mountNames[unclear.type]}; nobody has recorded what it fits.`)
  }
  if (!included) return lacking(['mountsIncluded'], () => 'Nobody has recorded which mounts come with it.')
  const open = sold.filter((type) => check(type, limitsOfLight(specs)) !== false)
  if (open.length > 0)
    return {
      outcome: 'change',
      measured: sold,
      asks: { need: 'light-mount', amount: null, unit: null },
      say: () => `Needs ${listNames(open)}, sold apart.`,
    }
  if (!possible) return lacking(['mountsPossible'], () => 'Nobody has recorded which mounts its maker sells for it.')
  return {
    outcome: 'change',
    measured: [...included, ...sold],
    asks: { need: 'light-mount', amount: null, unit: null },
    say: () => 'Its maker has no mount for this tank; a home-made one is outside what can be checked here.',
  }
}
