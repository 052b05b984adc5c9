import { lacking, type Candidate, type Judgement, type Rule } from '../rule'
import { once, type Scene } from '../scene'
import { findBasins, type Basin } from '../setup/places'
import type { Placement } from '../types'
import { readMeasure, readText } from '../values'
import { findUsualBasins, glanceAtSpace, spaceUses } from './heater-glance'
import { hasAreas, noAreas } from './shape'
import { describeShares, shareOut } from './rod-shares'
import { chooseStand, describeStand, listSizes } from './rod-space'

/** Positions to try, in order, by what its maker allows. */
export const positionsBy: Readonly<Record<string, readonly Placement['position'][]>> = {
  vertical: ['upright'],
  horizontal: ['flat'],
  any: ['upright', 'leaning', 'flat'],
}

const restsOnFiltration = () => ['tank.filtration']

/** What the sizes of a chamber follow from where nobody said them. */
const tankSizes = ['waterLineMm', 'outerHeightMm', 'bottomMm', 'wallMm', 'outerLengthMm', 'outerWidthMm'].map(
  (key) => `tank.${key}`,
)

const listDerived = ({ plan }: Scene, sizes: readonly string[]): readonly string[] => [
  ...new Set(sizes.some((path) => plan.assumed.has(path)) ? [...sizes, ...tankSizes] : sizes),
]

/** Without chambers, whether there is a sump decides which water it is. */
const restsOnPlace = ({ plan }: Scene, { path }: Basin): readonly string[] =>
  plan.tank.chambers.length === 0 && path !== 'tank.sump' ? ['tank.filtration'] : []

function judgeInline({ plan }: Scene): Judgement {
  if (plan.tank.filtration === 'sump')
    return { outcome: 'pass', rests: restsOnFiltration, say: () => 'Sits in the return line, outside the tank.' }
  return {
    outcome: 'change',
    rests: restsOnFiltration,
    asks: { need: 'return-line', amount: null, unit: null },
    say: () => 'Sits in a hose, not in the water: needs a pump line outside the tank.',
  }
}

function judgeSpace(scene: Scene, { piece, quantity, place }: Candidate): Judgement {
  const { specs } = piece
  if (readText(specs, 'form') === 'inline') return judgeInline(scene)
  const length = readMeasure(specs, 'lengthMm')
  const diameter = readMeasure(specs, 'diameterMm')
  const missing = [...(length ? [] : ['lengthMm']), ...(diameter ? [] : ['diameterMm'])]
  if (!length || !diameter)
    return lacking(
      missing,
      () =>
        `Nobody has recorded its ${missing.length > 1 ? 'length and thickness' : length ? 'thickness' : 'length'} yet.`,
    )
  const basins = place ? findBasins(scene.plan, place) : once(scene, findUsualBasins)
  const rod = { length, diameter, immersed: readMeasure(specs, 'minImmersionMm') ?? length, quantity }
  const orientation = readText(specs, 'orientation')
  const tryAll = (by: string) => chooseStand(rod, basins, scene.others, positionsBy[by] ?? [])
  const stands = tryAll(orientation ?? 'vertical')
  const [stand] = stands
  if (!stand)
    return {
      outcome: 'fail',
      rests: () => [],
      say: () =>
        place && 'chamber' in place
          ? `The tank has no chamber “${place.chamber}”.`
          : 'There is no water for it to heat in that place.',
    }
  if (stand.basin.path === 'tank' && !hasAreas(scene.plan)) return noAreas(scene.plan)
  const shares =
    quantity > 1 && !stand.fits
      ? shareOut(rod, basins, scene.others, positionsBy[orientation ?? 'vertical'] ?? [])
      : undefined
  if (shares?.[0])
    return {
      outcome: 'pass',
      probability: () => Math.min(...shares.map((share) => share.stand.probability())),
      settle: () => shares.toSorted((a, b) => a.stand.probability() - b.stand.probability())[0]?.stand.settle(),
      placement: shares[0].stand.placement,
      rests: () => [...new Set(shares.flatMap((share) => listSizes(share.stand)))],
      say: describeShares(shares),
    }
  if (!stand.fits && orientation === undefined && (tryAll('any')[0]?.fits || tryAll('horizontal')[0]?.fits))
    return lacking(
      ['orientation'],
      (words) =>
        `${describeStand(stand)(words)} It would fit leaning or lying, if its maker allows that: nobody has recorded it yet.`,
    )
  const cautions = [
    ...(stand.basin.id === 'display' && stand.fits
      ? [() => 'No chamber for it: it stands in the display, where animals can touch it. A guard keeps them off.']
      : []),
    ...(orientation === undefined && stand.fits
      ? [() => 'Its maker’s word on orientation is not recorded; standing was assumed.']
      : []),
  ]
  return {
    outcome: stand.fits ? 'pass' : 'fail',
    ...(stand.tight !== 'company' && { measured: stand.measuredMm, limit: stand.limitMm }),
    probability: stand.probability,
    settle: stand.settle,
    ...(stand.fits && { placement: stand.placement }),
    rests: () => [...listDerived(scene, stands.flatMap(listSizes)), ...restsOnPlace(scene, stand.basin)],
    say: describeStand(stand),
    cautions,
  }
}

export const heaterSpace: Rule = {
  id: 'heater.space',
  label: 'Room for the rod',
  worst: 'fail',
  unit: 'mm',
  basis: {
    type: 'physics',
    source:
      'Rectangle in rectangle: Carver 1957, American Mathematical Monthly 64; Wetzel 2000, Mathematics Magazine 73(3)',
  },
  rule: 'The rod must stand, lean or lie in its place, as its maker allows, with water around it seen from above. Standing: the length that must be under water within the water depth, the whole rod within the height. Leaning and lying: the whole rod under water.',
  reads: ['lengthMm', 'diameterMm', 'minImmersionMm', 'orientation', 'form'],
  uses: spaceUses,
  failLabel: 'too long or too thick for the place',
  glance: glanceAtSpace,
  judge: judgeSpace,
}
