import { findPressureKPa } from '../checks/ro-unit'
import { readFlag, readNumber } from '../values'
import { pickSpecs, type Filled, type FillInput } from './fill-types'

const membraneKeys = ['membraneLpd', 'testPressureKPa', 'testTempC', 'testTdsPpm', 'rejectionFraction', 'wasteRatio']

export function fillMembrane({ scene, subject }: FillInput): Filled {
  const { feedKPa, feedTempC, feedTdsPpm } = scene.plan.water
  if (!subject) return { feedKPa, feedTempC, feedTdsPpm }
  const hasOwnBooster = readFlag(subject.piece.specs, 'boosterIncluded') ?? false
  return {
    ...pickSpecs(subject.piece, membraneKeys),
    feedKPa: findPressureKPa(scene, subject.piece.specs, { hasOwnBooster, others: scene.others }),
    feedTempC,
    feedTdsPpm,
  }
}

export function fillSand({ scene, subject }: FillInput): Filled {
  const { tank, goals } = scene.plan
  return {
    lengthMm: tank.displayLengthMm,
    widthMm: tank.displayWidthMm,
    depthMm: goals.sandDepthMm,
    ...(subject && pickSpecs(subject.piece, ['bulkDensityKgL', 'packKg', 'grainMinMm', 'grainMaxMm'])),
  }
}

export const fillSalt = ({ scene, subject }: FillInput): Filled => ({
  volumeL: scene.plan.tank.waterL,
  salinityPpt: scene.plan.goals.salinityPpt,
  ...(subject && pickSpecs(subject.piece, ['makesL', 'packKg'])),
})

export const fillSeawater = ({ scene }: FillInput): Filled => ({
  salinityPpt: scene.plan.goals.salinityPpt,
  temperatureC: scene.plan.goals.temperatureC,
})

export function fillWeight({ scene, items }: FillInput): Filled {
  const { goals, setup } = scene.plan
  const stand = items.find(({ piece }) => piece.kind === 'stand')?.piece
  const sizeOf = (key: 'lengthMm' | 'widthMm', top: string) =>
    (stand && readNumber(stand.specs, top)) ?? setup.support?.[key]
  return {
    salinityPpt: goals.salinityPpt,
    temperatureC: goals.temperatureC,
    rockKg: goals.rockKg,
    sandDepthMm: goals.sandDepthMm,
    standKg: stand && readNumber(stand.specs, 'massKg'),
    standLengthMm: sizeOf('lengthMm', 'topLengthMm'),
    standWidthMm: sizeOf('widthMm', 'topWidthMm'),
  }
}
