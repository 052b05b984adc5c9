import { describe, expect, it } from 'vitest'
import { lightPlane } from '#shared/engine/checks/light-plane'
import { fitCheck } from '#shared/engine/fit'
import type { CandidateOptions } from '#shared/engine/candidates'
import type { Setup } from '#shared/engine/types'
import { item, judge, judgeOutcome, piece, sceneFor, toPlain, wholeSetup } from '../build'

type Values = Readonly<Record<string, unknown>>

const lamp = (values: Values = {}) =>
  piece('light', {
    layout: 'point',
    lengthMm: 80,
    widthMm: 80,
    heightMm: 40,
    massKg: 0.6,
    beamAngleDeg: 90,
    ppfdUmol: 400,
    ppfdAtMm: 300,
    dimmable: true,
    mountsIncluded: ['arm'],
    mountsPossible: ['hanging'],
    armRimMinMm: 5,
    armRimMaxMm: 15,
    control: 'app-built-in',
    bands: [
      { fromNm: 400, toNm: 500, share: 0.5 },
      { fromNm: 500, toNm: 700, share: 0.5 },
    ],
    powerW: 60,
    plugs: 1,
    volts: [120],
    plugType: 'A/B',
    ...values,
  })
const keeping = (coral: NonNullable<Setup['goals']>['coral'], rest: Partial<Setup> = {}) =>
  wholeSetup({}, { goals: { ...wholeSetup().goals, ...(coral && { coral }) }, ...rest })
const at200: CandidateOptions = { mountHeightMm: 200 }
const brightness = (values: Values, options: CandidateOptions = at200, setup = wholeSetup()) =>
  judge(setup, lamp(values), 'light.intensity', options)
const coverage = (values: Values, options: CandidateOptions = at200, setup = wholeSetup()) =>
  judge(setup, lamp(values), 'light.coverage', options)

/** The model is linear in the reading: the PPFD reading with which one light's brightest point on the plane is `umol`. */
const readingFor = (umol: number, values: Values = {}, setup = wholeSetup()) =>
  umol / (brightness({ ...values, ppfdUmol: 1 }, at200, setup).measured as number)

/** Too long for a few spots to cover, or to add up. */
const longTank = { outerLengthMm: 2520, displayLengthMm: 2500 }
const spot = { beamAngleDeg: 20 }

describe('the brightness of a light', () => {
  it('reaches the lower end of the band that the corals are kept under', () => {
    const outcome = (umol: number, coral: NonNullable<Setup['goals']>['coral']) => {
      const setup = wholeSetup(longTank, { goals: { ...wholeSetup().goals, ...(coral && { coral }) } })
      return brightness({ ...spot, ppfdUmol: readingFor(umol, spot, setup) }, at200, setup).outcome
    }
    // Common practice: 50 to 150 for soft and large-polyp corals, 200 to 350 for small-polyp ones.
    expect(outcome(50.01, ['soft', 'lps'])).toBe('pass')
    expect(outcome(49.99, ['soft', 'lps'])).toBe('fail')
    expect(outcome(200.01, ['soft', 'sps'])).toBe('pass')
    expect(outcome(199.99, ['soft', 'sps'])).toBe('fail')
  })

  it('is not judged for fish only, and neither is coverage', () => {
    const ids = fitCheck(keeping([]), lamp()).checks.map(({ id }) => id)
    expect(ids).not.toContain('light.intensity')
    expect(ids).not.toContain('light.coverage')
  })

  it('is too much where more than half of the tank is above the band and nothing dims it', () => {
    const strong = { beamAngleDeg: 120, ppfdUmol: 3000 }
    expect(brightness({ ...strong, dimmable: false }).outcome).toBe('fail')
    expect(brightness({ ...strong, dimmable: false }).margin).toBeLessThan(0)
    expect(brightness({ ...strong, dimmable: true }).outcome).toBe('pass')
    expect(brightness({ ...strong, dimmable: undefined })).toMatchObject({ outcome: 'nodata', missing: ['dimmable'] })
    // A spot: bright in the middle alone.
    expect(brightness({ beamAngleDeg: 20, ppfdUmol: 500, dimmable: false }).outcome).toBe('pass')
  })

  it('follows from the photon flux where no reading is known', () => {
    const values = { ppfdUmol: undefined, ppfdAtMm: undefined, photonFluxUmolS: 40 }
    // m = 2: on the axis I₀ = 3 × 40/2π = 19.0986; over (0.2 + 0.175/1.34)² × 0.979 × e^−0.0245.
    const onAxis = (((3 * 40) / (2 * Math.PI)) * 0.979 * Math.exp(-0.14 * 0.175)) / (0.2 + 0.175 / 1.34) ** 2
    expect(Math.abs((brightness(values).measured as number) / onAxis - 1)).toBeLessThan(2e-3)
    expect(brightness({ ...values, photonFluxUmolS: undefined })).toMatchObject({
      outcome: 'nodata',
      missing: ['ppfdUmol', 'ppfdAtMm'],
    })
    expect(brightness({ layout: undefined }).missing).toEqual(['layout'])
    expect(brightness({ layout: 'strip', widthMm: undefined }).missing).toEqual(['widthMm'])
    expect(brightness({ widthMm: undefined }).outcome).toBe('pass')
  })

  it('is judged with as many as it takes to cover the tank', () => {
    // One of 45 µmol is too dim; in a tank this small several add up.
    const dim = { beamAngleDeg: 140, ppfdUmol: readingFor(45, { beamAngleDeg: 140 }) }
    expect(brightness({ ...dim, ppfdUmol: dim.ppfdUmol / 100 }).measured).toBeCloseTo(0.45, 9)
    const found = brightness(dim)
    expect(found.measured).toBeGreaterThan(60)
    expect(found.outcome).toBe('pass')
    expect(brightness(dim, { ...at200, quantity: 1 }).message).toMatch(/under (two|three|four) of these/)
    expect(coverage(dim).outcome).toBe('change')
    expect(fitCheck(wholeSetup(), lamp(dim), { mountHeightMm: 200 }).pieces[0]?.quantity).toBeGreaterThan(1)
  })

  it('cannot be told over a tank whose areas cannot be computed', () => {
    const round = wholeSetup({ shape: 'bow-front' })
    expect(judgeOutcome(round, lamp(), 'light.intensity')).toBe('nodata')
    expect(judgeOutcome(round, lamp(), 'light.coverage')).toBe('nodata')
  })
})

describe('a height that nobody said', () => {
  const long = wholeSetup(longTank)

  it('is 200 mm, or 60 mm on legs, and said to be assumed', () => {
    expect(toPlain(brightness({}, {}).message)).toContain('(lens 200 mm above the water, assumed)')
    expect(toPlain(brightness({ mountsIncluded: ['rim-legs'] }, {}).message)).toContain('(lens 60 mm above')
    expect(brightness({}).message).not.toContain('assumed')
  })

  it('condemns no light that another usual height lets pass', () => {
    const dim = { ...spot, ppfdUmol: readingFor(40, spot, long) }
    expect(brightness(dim, at200, long).outcome).toBe('fail')
    expect(brightness(dim, {}, long).outcome).toBe('change')
    expect(toPlain(brightness(dim, {}, long).message)).toContain(
      'It works with the lens 150 mm above the water; we assumed 200 mm.',
    )
  })

  it('condemns one that none does', () => {
    expect(brightness({ ...spot, ppfdUmol: readingFor(4, spot, long) }, {}, long).outcome).toBe('fail')
  })

  it('does not lift a light on legs higher than legs go', () => {
    const strong = { mountsIncluded: ['rim-legs'], mountsPossible: [], beamAngleDeg: 120, dimmable: false }
    // Bright enough to need some 400 mm.
    const found = brightness({ ...strong, ppfdUmol: 3000 }, {})
    expect(found.outcome).toBe('fail')
  })
})

describe('corals that nobody named', () => {
  const unnamed = (() => {
    const { coral: _, ...goals } = wholeSetup().goals ?? {}
    return wholeSetup({}, { goals })
  })()

  it('are soft and large-polyp ones, named as such', () => {
    const found = brightness({}, at200, unnamed)
    expect(found.assumed).toContain('goals.coral')
    expect(found.message).toContain('soft and large-polyp corals want 50–150')
    expect(brightness({}).message).toContain('your corals want')
  })

  it('condemn no light that suits small-polyp ones', () => {
    const bright = { beamAngleDeg: 120, dimmable: false, ppfdUmol: readingFor(340, { beamAngleDeg: 120 }) }
    expect(brightness(bright).outcome).toBe('fail')
    expect(brightness(bright, at200, unnamed)).toMatchObject({
      outcome: 'change',
      message: expect.stringContaining('It suits small-polyp corals; we assumed soft and large-polyp ones.') as string,
    })
    expect(brightness({ ppfdUmol: 1 }, at200, unnamed).outcome).toBe('fail')
  })
})

describe('the limits of brightness and coverage', () => {
  const readings = Array.from({ length: 420 }, (_, index) => 20 * 1.006 ** index)

  it('are half of the tank above the band for a light that cannot be dimmed', () => {
    const shares = readings.map((ppfdUmol) => {
      const values = { beamAngleDeg: 100, dimmable: false, ppfdUmol }
      const { aboveShare, brightestUmol } = lightPlane(
        sceneFor(wholeSetup(), 'light'),
        lamp(values).specs,
        4,
        200,
        [50, 150],
      )
      const { outcome } = brightness(values, { ...at200, quantity: 4 })
      expect(outcome, String(aboveShare)).toBe(aboveShare > 0.5 || brightestUmol < 50 ? 'fail' : 'pass')
      return aboveShare
    })
    expect(shares.some((share) => share > 0.45 && share <= 0.5)).toBe(true)
    expect(shares.some((share) => share > 0.5 && share < 0.55)).toBe(true)
  }, 60_000)

  it('are 70 % and 50 % of the tank inside it, where no more of the light are tried', () => {
    const shares = readings.map((ppfdUmol) => {
      const found = coverage({ beamAngleDeg: 100, dimmable: false, ppfdUmol }, { ...at200, quantity: 4 })
      const share = found.measured as number
      expect(found.outcome, String(share)).toBe(share >= 0.7 ? 'pass' : share >= 0.5 ? 'change' : 'fail')
      return share
    })
    for (const [low, high] of [
      [0.48, 0.5],
      [0.5, 0.52],
      [0.68, 0.7],
      [0.7, 0.72],
    ] as const)
      expect(
        shares.some((share) => share >= low && share < high),
        `${low}`,
      ).toBe(true)
  }, 60_000)
})

describe('the coverage of a light', () => {
  const long = wholeSetup({ outerLengthMm: 1520, displayLengthMm: 1500 })
  const beams = [20, 35, 50, 65, 80, 95, 110, 125, 140]
  const all = beams.flatMap((beamAngleDeg) =>
    [wholeSetup(), long].map((setup) => ({ setup, values: { beamAngleDeg, ppfdUmol: 2000 } })),
  )
  const share = (setup: Setup, values: Values, quantity: number) =>
    coverage(values, { ...at200, quantity }, setup).measured as number

  it('passes from 70 % of the tank in the band; else asks for the fewest that reach it; else from 50 % leaves dim ends', () => {
    const seen = new Set<string>()
    for (const { setup, values } of all) {
      const shares = [1, 2, 3, 4].map((count) => share(setup, values, count))
      const enough = shares.findIndex((one) => one >= 0.7) + 1
      const found = coverage(values, { ...at200, quantity: 1 }, setup)
      const expected = enough === 1 ? 'pass' : enough > 1 || (shares[0] ?? 0) >= 0.5 ? 'change' : 'fail'
      expect(found.outcome, JSON.stringify(values)).toBe(expected)
      if (enough > 1)
        expect(found.message).toContain(`${['', '', 'Two', 'Three', 'Four'][enough]} of these: one lights only`)
      else if (expected === 'change') expect(found.message).toContain('the ends stay dim')
      seen.add(enough > 1 ? 'several' : expected)
    }
    expect([...seen].sort()).toEqual(['change', 'fail', 'pass', 'several'].filter((one) => seen.has(one)))
    expect(seen.size).toBeGreaterThanOrEqual(3)
  })

  it('answers for as many as it asks for, in checks, plugs and verdict alike', () => {
    const values = { beamAngleDeg: 120, ppfdUmol: 2000 }
    const answer = fitCheck(long, lamp(values), at200)
    const count = answer.pieces[0]?.quantity ?? 0
    expect(count).toBeGreaterThan(1)
    expect(answer.verdict).toBe('changes')
    expect(answer.checks.find(({ id }) => id === 'light.plugs')?.measured).toBe(count)
    expect(answer.checks.find(({ id }) => id === 'light.coverage')?.message).toContain('together they light')
  })

  it('is worth a word where more than 35 % of the photons miss the water', () => {
    const spill = (values: Values, mountHeightMm: number) =>
      fitCheck(wholeSetup(), lamp(values), { mountHeightMm }).cautions.filter((text) =>
        text.includes('misses the water'),
      )
    expect(spill({ beamAngleDeg: 140 }, 400)).toHaveLength(1)
    expect(spill({ beamAngleDeg: 30 }, 100)).toEqual([])
    expect(toPlain(spill({ beamAngleDeg: 100 }, 400)[0])).toMatch(
      /with the lens \d+ mm above the water it is under 35 %/,
    )
  })
})

describe('the length of a light', () => {
  const outcome = (lengthMm: number | undefined, values: Values = {}) =>
    judge(wholeSetup(), lamp({ lengthMm, ...values }), 'light.body')

  it('is at most the tank’s and 50 mm', () => {
    expect(outcome(670).outcome).toBe('pass')
    expect(outcome(670.06, { mountsPossible: [] }).outcome).toBe('fail')
    expect(outcome(undefined)).toMatchObject({ outcome: 'nodata', missing: ['lengthMm'] })
  })

  it('may be up to 1.25 times the tank’s where it hangs', () => {
    expect(outcome(775).outcome).toBe('change')
    expect(outcome(775.06).outcome).toBe('fail')
    expect(outcome(775, { mountsIncluded: ['ceiling'], mountsPossible: [] }).outcome).toBe('change')
    expect(outcome(775, { mountsPossible: [] }).outcome).toBe('fail')
  })

  it('is no data where nobody recorded whether it can hang', () => {
    expect(outcome(700, { mountsPossible: undefined })).toMatchObject({
      outcome: 'nodata',
      missing: ['mountsPossible'],
    })
    expect(outcome(800, { mountsPossible: undefined }).outcome).toBe('fail')
  })
})

describe('the spectrum of a light', () => {
  const outcome = (blue: number) =>
    judgeOutcome(
      wholeSetup(),
      lamp({
        bands: [
          { fromNm: 400, toNm: 500, share: blue },
          { fromNm: 500, toNm: 700, share: 1 - blue },
        ],
      }),
      'light.spectrum',
    )

  it('has at least 35 % of its photons from 400 to 500 nm, else it is warmer than corals prefer', () => {
    expect(outcome(0.35)).toBe('pass')
    expect(outcome(0.349)).toBe('change')
  })

  it('decides nothing and is a caution where it is not recorded', () => {
    const answer = fitCheck(wholeSetup(), lamp({ bands: undefined }), at200)
    expect(answer.checks.find(({ id }) => id === 'light.spectrum')).toMatchObject({
      outcome: 'nodata',
      missing: ['bands'],
    })
    expect(answer.verdict).not.toBe('unknown')
    expect(answer.cautions.join(' ')).toContain('Its spectrum is not recorded')
  })
})

describe('the mount of a light', () => {
  const mount = (values: Values, setup = wholeSetup()) => judge(setup, lamp(values), 'light.mount')
  const arm = { mountsIncluded: ['arm'], mountsPossible: [] }
  const legs = { mountsIncluded: ['rim-legs'], mountsPossible: [] }

  it('comes with it: an arm around the wall', () => {
    expect(mount({ ...arm, armRimMinMm: 10, armRimMaxMm: 10 }).outcome).toBe('pass')
    expect(mount({ ...arm, armRimMinMm: 11, armRimMaxMm: 20 }).outcome).toBe('change')
    expect(mount({ ...arm, armRimMinMm: 2, armRimMaxMm: 9 }).outcome).toBe('change')
    expect(mount({ ...arm, armRimMaxMm: undefined })).toMatchObject({ outcome: 'nodata', missing: ['armRimMaxMm'] })
  })

  it('comes with it: legs that span the tank’s length or its width', () => {
    const span = (legSpanMinMm: number, legSpanMaxMm: number) => mount({ ...legs, legSpanMinMm, legSpanMaxMm }).outcome
    expect(span(600, 620)).toBe('pass')
    expect(span(420, 500)).toBe('pass')
    expect(span(430, 610)).toBe('change')
  })

  it('comes with it: a hanging kit under a ceiling that is high enough', () => {
    const hung = { mountsIncluded: ['hanging'], mountsPossible: [] }
    // Rim at 1150, lens 200 above the water, 40 of lamp: 1390 mm.
    const under = (ceilingMm: number, values: Values = {}) =>
      mount({ ...hung, ...values }, wholeSetup({}, { room: { ...wholeSetup().room, ceilingMm } }))
    expect(under(1390).outcome).toBe('pass')
    expect(under(1389).outcome).toBe('change')
    expect(under(2400, { heightMm: undefined })).toMatchObject({ outcome: 'nodata', missing: ['heightMm'] })
    expect(under(1300, { heightMm: undefined }).outcome).toBe('change')
  })

  it('is sold apart, or there is none', () => {
    const none = { mountsIncluded: [], mountsPossible: [] }
    expect(mount({ ...none, mountsPossible: ['hanging', 'arm'] })).toMatchObject({
      outcome: 'change',
      message: 'Needs a hanging kit or an arm on the rim, sold apart.',
    })
    expect(mount(none).message).toContain('Its maker has no mount for this tank; a home-made one is outside')
    // An arm that is known not to go around the wall is not proposed.
    expect(mount({ ...none, mountsPossible: ['hanging', 'arm'], armRimMaxMm: 9 }).message).toBe(
      'Needs a hanging kit, sold apart.',
    )
  })

  it('is no data where what comes with it, or is sold for it, is not recorded', () => {
    expect(mount({ mountsIncluded: undefined, mountsPossible: undefined }).outcome).toBe('nodata')
    expect(mount({ mountsIncluded: undefined }).missing).toEqual(['mountsIncluded'])
    expect(mount({ mountsIncluded: [], mountsPossible: undefined }).missing).toEqual(['mountsPossible'])
    expect(mount({ mountsIncluded: ['canopy'], mountsPossible: [] }).outcome).toBe('nodata')
  })

  it('is in the setup', () => {
    const holding = (values: Values) =>
      wholeSetup(
        {},
        { items: [item('mount', piece('light-mount', { type: 'arm', rimMinMm: 4, rimMaxMm: 12, ...values }))] },
      )
    const apart = { mountsIncluded: [], mountsPossible: ['arm'] }
    expect(mount(apart, holding({})).outcome).toBe('pass')
    expect(mount(apart, holding({ rimMaxMm: 9 })).outcome).toBe('change')
    expect(mount({ ...apart, mountsPossible: ['hanging'] }, holding({})).outcome).toBe('change')
  })
})

describe('the control of a light', () => {
  const goals = { ...wholeSetup().goals, appControl: true }
  const control = (values: Values, items: Setup['items'] = []) =>
    judge(wholeSetup({}, { goals, items }), lamp(values), 'light.control')
  const controller = (controlGroup: string | undefined) => [
    item('controller', piece('light-controller', { controlGroup })),
  ]

  it('is judged only where control by app is wanted', () => {
    expect(fitCheck(wholeSetup(), lamp()).checks.map(({ id }) => id)).not.toContain('light.control')
    expect(control({}).outcome).toBe('pass')
  })

  it('is a change where it takes a controller, unless one of its group is there', () => {
    const needy = { control: 'controller-needed', controlGroup: 'Tide' }
    expect(control(needy).message).toBe('Set by app only with a controller of the Tide group.')
    expect(control(needy, controller('Tide')).outcome).toBe('pass')
    expect(control(needy, controller('Reefline')).outcome).toBe('change')
    expect(control(needy, controller(undefined)).outcome).toBe('nodata')
    expect(control({ ...needy, controlGroup: undefined }, controller('Tide')).missing).toEqual(['controlGroup'])
    expect(control({ ...needy, controlGroup: undefined }).outcome).toBe('change')
  })

  it('is a change where there is none, and no data where nobody recorded it', () => {
    expect(control({ control: 'on-unit' })).toMatchObject({ outcome: 'change', message: 'Cannot be set by app.' })
    expect(control({ control: undefined })).toMatchObject({ outcome: 'nodata', missing: ['control'] })
  })
})
