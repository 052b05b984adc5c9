import type { Mark, Scale, Verdict } from '#shared/engine/types'
import type { TankDrawing } from '../../../src/components/drawings/tank-drawing'

// Every number and name here is invented for looking at.

const cube = { outerLengthMm: 589, outerWidthMm: 399, outerHeightMm: 399, wallMm: 8, bottomMm: 8, waterLineMm: 367 }

const heaterChamber = { id: 'a', name: 'Heater chamber', lengthMm: 102, widthMm: 127, waterDepthMm: 305 }

export const standingTank: TankDrawing = {
  ...cube,
  chambers: [heaterChamber],
  given: new Set(['tank.chambers.0.lengthMm', 'tank.chambers.0.widthMm', 'tank.chambers.0.waterDepthMm']),
  rod: { chamber: 'a', position: 'upright', angleDeg: 90, lengthMm: 269, diameterMm: 26, verdict: 'fits' },
}

export const leaningTank: TankDrawing = {
  ...cube,
  chambers: [{ ...heaterChamber, lengthMm: 200, waterDepthMm: 250 }],
  given: new Set(['tank.outerLengthMm', 'tank.outerWidthMm', 'tank.outerHeightMm', 'tank.wallMm']),
  rod: { chamber: 'a', position: 'leaning', angleDeg: 63, lengthMm: 262, diameterMm: 24, verdict: 'changes' },
}

export const manyChambers: TankDrawing = {
  outerLengthMm: 1219,
  outerWidthMm: 457,
  outerHeightMm: 508,
  wallMm: 12,
  bottomMm: 12,
  waterLineMm: 470,
  chambers: [
    { id: 'a', name: 'Overflow', lengthMm: 152, widthMm: 110, waterDepthMm: 420 },
    { id: 'b', name: 'Baskets', lengthMm: 203, widthMm: 110, waterDepthMm: 400 },
    { id: 'c', name: 'Pump', lengthMm: 127, widthMm: 110, waterDepthMm: 330 },
    { id: 'd', name: 'Heater', lengthMm: 300, widthMm: 110, waterDepthMm: 330 },
  ],
  given: new Set(['tank.outerLengthMm', 'tank.chambers.3.lengthMm', 'tank.waterLineMm']),
  rod: { chamber: 'd', position: 'flat', angleDeg: 0, lengthMm: 270, diameterMm: 28, verdict: 'fits' },
}

export const scales: readonly Scale[] = [
  {
    key: 'lengthMm',
    check: 'heater.space',
    label: 'Length in water',
    unit: 'mm',
    limitText: 'limit 12 in, the depth of the chamber',
    limits: [304.8],
    zones: [
      { from: 0, to: 304.8, outcome: 'pass' },
      { from: 304.8, to: 450, outcome: 'fail' },
    ],
  },
  {
    key: 'powerW',
    check: 'heater.power',
    label: 'Power',
    unit: 'W',
    limitText: 'need 75 to 86 W in a 60 °F room',
    limits: [86],
    zones: [
      { from: 0, to: 50, outcome: 'fail' },
      { from: 50, to: 86, outcome: 'change' },
      { from: 86, to: 160, outcome: 'pass' },
      { from: 160, to: 200, outcome: 'change' },
      { from: 200, to: 400, outcome: 'fail' },
    ],
  },
]

const verdicts: readonly Verdict[] = ['fits', 'changes', 'no', 'unknown']
const powers = [25, 50, 50, 75, 100, 100, 100, 150, 200, 250]

/** Spread by a fixed stride, so that every run draws the same. */
export const marks: readonly Mark[] = Array.from({ length: 46 }, (_, at) => {
  const lengthMm = 150 + ((at * 47) % 190)
  const powerW = powers[(at * 7) % powers.length] ?? 100
  const verdict = lengthMm > 304.8 ? 'no' : powerW > 200 || powerW < 50 ? 'no' : powerW < 86 ? 'changes' : 'fits'
  return {
    slug: `rod-${at}`,
    brand: 'Marlin & Fenn',
    model: `Stoker ${at}`,
    verdict: at % 13 === 5 ? verdicts[3]! : verdict,
    values: { lengthMm: at % 13 === 5 ? null : lengthMm, powerW },
  }
})

export const nameOf = (slug: string): string => `Marlin & Fenn ${slug.replace('rod-', 'Stoker ')}`
