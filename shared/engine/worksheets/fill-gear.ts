import { getKind } from '../../kinds/index'
import { positionsBy } from '../checks/heater-space'
import { chooseHeightMm } from '../checks/light-plane'
import { describePlumbing } from '../checks/pump-flow'
import { choosePumpBasin } from '../checks/return-pump'
import { chooseStand } from '../checks/rod-space'
import { sumGainW, sumHeaterW } from '../heat-budget'
import { findIncludedPump, pluggedIn } from '../mains-budget'
import type { CurvePoint } from '../physics/pump'
import { findBasins, type Basin } from '../setup/places'
import { readGroups, readMeasure, readNumber, readText } from '../values'
import { pickSpecs, type Filled, type FillInput } from './fill-types'
import { lightKeys } from './light-values'

export function fillHeat({ scene, items }: FillInput): Filled {
  const heaterW = sumHeaterW(items)
  return { heaterW: heaterW > 0 ? heaterW : undefined, inTankW: sumGainW(scene.plan, items) }
}

/** Of several places the one that the heater's check would take. */
function findRodBasin({ scene, subject }: FillInput): Basin | undefined {
  const basins = findBasins(scene.plan, subject?.place)
  const length = subject && readMeasure(subject.piece.specs, 'lengthMm')
  const diameter = subject && readMeasure(subject.piece.specs, 'diameterMm')
  if (!subject || !length || !diameter) return basins[0]
  const { specs } = subject.piece
  const rod = { length, diameter, immersed: readMeasure(specs, 'minImmersionMm') ?? length, quantity: 1 }
  const positions = positionsBy[readText(specs, 'orientation') ?? 'vertical'] ?? []
  return chooseStand(rod, basins, scene.others, positions)[0]?.basin
}

export function fillRod(input: FillInput): Filled {
  const basin = findRodBasin(input)
  const { subject } = input
  return {
    ...(subject && pickSpecs(subject.piece, ['lengthMm', 'diameterMm', 'minImmersionMm'])),
    orientation: subject && (readText(subject.piece.specs, 'orientation') ?? 'vertical'),
    ...(basin && {
      'chamber.lengthMm': basin.lengthMm,
      'chamber.widthMm': basin.widthMm,
      'chamber.waterDepthMm': basin.waterDepthMm,
      'chamber.heightMm': Number.isFinite(basin.heightMm) ? basin.heightMm : undefined,
      'chamber.openingLengthMm': basin.openingLengthMm,
      'chamber.openingWidthMm': basin.openingWidthMm,
    }),
  }
}

export function fillLight({ scene, subject }: FillInput): Filled {
  if (!subject) return { coral: scene.plan.goals.coral }
  return {
    ...pickSpecs(subject.piece, lightKeys, 'light.'),
    quantity: subject.quantity,
    mountHeightMm: subject.mountHeightMm ?? chooseHeightMm(subject.piece.specs),
    coral: scene.plan.goals.coral,
  }
}

export function fillPump({ scene, subject }: FillInput): Filled {
  const { waterL } = scene.plan.tank
  if (!subject) return { volumeL: waterL }
  const { piece, quantity } = subject
  const basin = choosePumpBasin(scene, subject)
  const plumbing = basin && describePlumbing(scene, piece.specs, basin)
  const points = readGroups<CurvePoint>(piece.specs, 'flowCurve') ?? []
  return {
    ...Object.fromEntries(
      points.flatMap(({ flowLph, headM }, at) => [
        [`flowCurve.${at}.flowLph`, flowLph],
        [`flowCurve.${at}.headM`, headM],
      ]),
    ),
    ...(plumbing && {
      staticHeadM: plumbing.staticHeadM,
      boreMm: plumbing.pipe.boreMm,
      pipeLengthM: plumbing.pipe.lengthMm / 1000,
    }),
    // Each of several pumps turns its share of the water over.
    volumeL: waterL / quantity,
  }
}

export function fillPower({ scene, items }: FillInput): Filled {
  const { mains } = scene.plan
  const included = findIncludedPump(scene.plan, items)
  const loads = [
    ...items
      .filter(({ piece }) => pluggedIn.has(piece.kind))
      .map(({ piece, quantity }) => ({
        name: piece.gear ? `${piece.gear.brand} ${piece.gear.model}`.slice(0, 60) : getKind(piece.kind).label,
        powerW: readNumber(piece.specs, 'powerW'),
        plugs: readNumber(piece.specs, 'plugs'),
        quantity: quantity > 1 ? quantity : undefined,
      })),
    ...(included?.powerW === undefined
      ? []
      : [{ name: 'included pump', powerW: included.powerW, plugs: included.plugs, quantity: undefined }]),
  ]
  const strips = items.filter(({ piece }) => piece.kind === 'power-strip').map(({ piece }) => piece)
  const ratings = strips.flatMap(({ specs }) => readNumber(specs, 'ratedA') ?? [])
  const outlets = strips.flatMap(({ specs }) => readNumber(specs, 'outlets') ?? [])
  return {
    ...Object.fromEntries(
      loads.flatMap((load, at) => Object.entries(load).map(([key, value]) => [`items.${at}.${key}`, value])),
    ),
    'strip.ratedA': ratings.length > 0 ? Math.min(...ratings) : undefined,
    'strip.outlets': outlets.length > 0 ? outlets.reduce((sum, one) => sum + one, 0) : undefined,
    'circuit.volts': mains.volts,
    'circuit.circuitA': mains.circuitA,
  }
}
