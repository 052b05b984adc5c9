import type { Random } from './random'

const wattages = [25, 50, 75, 100, 150, 200, 250, 300, 400, 500] as const

type Range = readonly [number, number]

interface Body {
  readonly form: string
  readonly startMm: Range
  readonly perW: Range
  readonly thicknessMm: Range
}

const bodies: readonly Body[] = [
  { form: 'glass-rod', startMm: [110, 150], perW: [0.6, 1], thicknessMm: [16, 32] },
  { form: 'polymer-rod', startMm: [120, 170], perW: [0.5, 0.8], thicknessMm: [22, 40] },
  { form: 'titanium-rod', startMm: [110, 160], perW: [0.35, 0.7], thicknessMm: [13, 26] },
  { form: 'inline', startMm: [250, 300], perW: [0.1, 0.3], thicknessMm: [50, 80] },
]

const cords = [
  { volts: [120], plugType: 'A/B' },
  { volts: [230], plugType: 'F' },
  { volts: [230], plugType: 'G' },
  { volts: [230], plugType: 'I' },
] as const

/** One family of heaters: the same body in several wattages, longer and rated for more water with each. */
export function drawHeaterFamily(random: Random): { size: string; values: Record<string, unknown> }[] {
  const body = random.pick([...bodies.slice(0, 3), ...bodies.slice(0, 3), ...bodies])
  const startMm = random.between(...body.startMm)
  const perW = random.between(...body.perW)
  const diameterMm = Number(random.between(...body.thicknessMm).toFixed(1))
  const litresPerW = random.between(0.5, 1.1)
  const common = {
    form: body.form,
    diameterMm,
    thermostat: random.pick(['built-in', 'built-in', 'built-in', 'external-included', 'external-needed']),
    orientation: random.pick(['any', 'any', 'vertical', 'horizontal']),
    madeFor: random.chance(0.85) ? ['reef', 'marine-fish', 'freshwater'] : ['freshwater', 'plants'],
    plugs: 1,
    cordMm: 100 * Math.round(random.between(10, 30)),
    ...random.pick(cords),
  }
  const first = Math.floor(random.between(0, 4))
  return wattages.slice(first, first + Math.floor(random.between(4, 8))).map((powerW) => {
    const lengthMm = Math.min(600, Math.round(startMm + perW * powerW))
    const all: Record<string, unknown> = {
      ...common,
      powerW,
      lengthMm,
      minImmersionMm: Math.round(lengthMm * random.between(0.7, 0.95)),
      ratedVolumeMinL: Math.round(0.5 * litresPerW * powerW),
      ratedVolumeMaxL: Math.round(litresPerW * powerW),
    }
    const known = Object.entries(all).filter(([key]) => random.chance(key === 'minImmersionMm' ? 0.5 : 0.97))
    return { size: `${powerW} W`, values: Object.fromEntries(known) }
  })
}
