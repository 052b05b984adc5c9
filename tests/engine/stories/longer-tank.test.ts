import { describe, expect, it } from 'vitest'
import { report } from '#shared/engine/report'
import { replacements } from '#shared/engine/swap/replacements'
import { heater, item, piece, toSpecs, wholeSetup } from '../build'
import { catalogueOf } from '../demo-catalogue'
import { findAnswer, findMove, slugsOf, tellKnockOns, tellOption } from './tell'

type Values = Readonly<Record<string, unknown>>

const mains = { volts: [120], plugType: 'A/B', plugs: 1 }
const shell = { wallMm: 10, bottomMm: 10, material: 'glass', rim: 'rimless', lid: 'none', shape: 'rectangle' }
const chambers = [{ id: 'rear', name: 'rear chamber', lengthMm: 150, widthMm: 90, waterDepthMm: 420, heightMm: 500 }]

/** Inside 680 × 480 mm, 520 mm of water: 169.7 L. */
const old: Values = {
  ...shell,
  outerLengthMm: 700,
  outerWidthMm: 500,
  outerHeightMm: 560,
  waterLineMm: 520,
  nominalVolumeL: 170,
  filtration: 'rear-chambers',
  displayLengthMm: 680,
  displayWidthMm: 380,
  chambers,
  includedPump: { flowLph: 1200, maxHeadM: 2, plugs: 1, boreMm: 16 },
  returnBoreMm: 16,
}
/** Inside 980 × 400 mm, 470 mm of water: 184.2 L. No pump comes with it. */
const longer = {
  ...shell,
  outerLengthMm: 1000,
  outerWidthMm: 420,
  outerHeightMm: 520,
  waterLineMm: 470,
  nominalVolumeL: 185,
  filtration: 'rear-chambers',
  displayLengthMm: 980,
  displayWidthMm: 300,
  chambers,
  returnBoreMm: 16,
}

const lamp = piece('light', {
  layout: 'point',
  lengthMm: 200,
  widthMm: 200,
  heightMm: 60,
  massKg: 1,
  beamAngleDeg: 80,
  ppfdUmol: 400,
  ppfdAtMm: 300,
  dimmable: true,
  mountsIncluded: ['arm'],
  armRimMinMm: 5,
  armRimMaxMm: 15,
  control: 'app-built-in',
  powerW: 90,
  ...mains,
})
const rod = heater({ powerW: 150, lengthMm: 300, ratedVolumeMinL: 100, ratedVolumeMaxL: 250 })
const stand = piece('stand', { topLengthMm: 720, topWidthMm: 520, loadRatingKg: 320 })
const pump = piece(
  'return-pump',
  {
    flowCurve: [
      { flowLph: 0, headM: 2.4 },
      { flowLph: 2000, headM: 0 },
    ],
    lengthMm: 80,
    widthMm: 60,
    heightMm: 80,
    boreMm: 16,
    submersible: true,
    dcControl: true,
    powerW: 20,
    ...mains,
  },
  'pump-2000',
)

const whole = wholeSetup()
const setup = {
  ...whole,
  tank: { specs: toSpecs(old, 'measured'), gear: { slug: 'old-170', brand: 'Inventmark', model: 'old-170' } },
  items: [
    item('light', lamp, { mountHeightMm: 250 }),
    item('heater', rod),
    item('stand', stand),
    item('sand', piece('sand', { packKg: 9 }), { quantity: 2 }),
    item('salt', piece('salt-mix', { makesL: 175 })),
  ],
}

describe('a tank of 170 L that is gone, and a longer one', () => {
  const catalogue = catalogueOf(
    piece('tank', longer, 'longer-185'),
    piece('tank', old, 'old-170'),
    piece('tank', { ...old, nominalVolumeL: 60 }, 'tiny'),
    pump,
  )
  const result = replacements(setup, 'tank', catalogue, { limit: 10, offset: 0 })!
  const answer = findAnswer(result, 'longer-185')
  const told = tellKnockOns(answer)

  it('had nothing wrong with light, heater and stand while it stood there', () => {
    const before = report(setup).items
    expect(before.map(({ id, verdict }) => [id, verdict])).toEqual(
      expect.arrayContaining([
        ['light', 'fits'],
        ['heater', 'fits'],
        ['stand', 'fits'],
      ]),
    )
  })

  it('is not among the answers itself', () => {
    expect(result.gone).toMatchObject({ id: 'tank', kind: 'tank', gear: { slug: 'old-170' } })
    expect(slugsOf(result)).toEqual(expect.arrayContaining(['longer-185', 'tiny']))
    expect(slugsOf(result)).toHaveLength(2)
    // 60 L in place of 170 L is another setup.
    expect(findAnswer(result, 'tiny').verdict).toBe('no')
  })

  it('does not stand on a stand of 720 × 520 mm with its 1000 × 420 mm, and all else is told all the same', () => {
    expect(answer.verdict).toBe('no')
    expect(answer.checks.find(({ id }) => id === 'tank.support')).toMatchObject({ outcome: 'fail' })
    expect(told.filter(([kind]) => kind !== 'budget')).toEqual([
      ['need', 'return-pump', null, 'change'],
      ['check', 'tank.support', null, 'fail'],
      ['check', 'stand', 'pass', 'fail'],
      ['check', 'light', 'pass', 'change'],
      ['check', 'heater', 'pass', 'change'],
      ['missing', 'circulation', null, null],
      // The pump that came with the old tank had a plug of its own, beside those of lamp and heater.
      ['freed', 'plugs', 3, 2],
    ])
  })

  it('needs a return pump for its bore, and is told of one that suits', () => {
    expect(answer.addOns.map(({ need, options }) => [need, options.map(tellOption)])).toContainEqual([
      'return-pump',
      [['pump-2000 × 1']],
    ])
  })

  it('is no longer covered by the one light', () => {
    expect(answer.knockOns.find(({ subject }) => subject === 'light')?.message).toContain('Two of these')
  })

  it('loses more heat than the heater has in reserve on the coldest night', () => {
    // From 25 to 18 °C, by hand. Old: sides 1.2064 m² / 0.14, floor 0.3264 m² / 0.18, surface 0.3264 m² / 0.10 make
    // 13.69 W/K, 95.9 W; evaporation by Shah at 140.06 W/m² 45.7 W: 141.6 W, and 150 W hold it.
    // New: 1.2972 / 0.14 + 0.392 / 0.18 + 0.392 / 0.10 = 15.36 W/K, 107.5 W; evaporation by ASHRAE at 95.10 W/m² 37.3 W
    // and by Shah 54.9 W: 144.8 to 162.4 W, between which 150 W are without reserve.
    expect(answer.knockOns.find(({ subject }) => subject === 'heater')?.message).toContain('no reserve')
    const [before, after] = findMove(answer, 'heatW')
    expect(before).toBeCloseTo(141.58, 1)
    expect(after).toBeCloseTo(162.45, 1)
  })

  it('takes more salt and sand', () => {
    // 0.68 × 0.48 × 0.52 m³ = 169.73 L; 0.98 × 0.40 × 0.47 m³ = 184.24 L. The pack makes 175 L.
    const [litres, more] = findMove(answer, 'saltWaterL')
    expect([litres, more]).toEqual([expect.closeTo(169.728, 6), expect.closeTo(184.24, 6)])
    // 680 × 380 × 40 mm = 10.336 L, × 1.54 kg/L = 15.92 kg; 980 × 300 × 40 mm = 11.76 L, 18.11 kg: over two bags of 9.
    const [sandKg, moreKg] = findMove(answer, 'sandKg')
    expect([sandKg, moreKg]).toEqual([expect.closeTo(15.917, 3), expect.closeTo(18.11, 3)])
  })

  it('weighs what its shell, water, rock and sand weigh', () => {
    const [before, after] = findMove(answer, 'massKg')
    // Shell of glass (EN 572-1), water (EOS-80), rock at the assumed 0.12 kg/L, sand as above, by hand:
    // 41.20 + 160.15 + 20.37 + 15.92 kg, and 46.20 + 173.54 + 22.11 + 18.11 kg.
    expect([before, after]).toEqual([expect.closeTo(237.64, 1), expect.closeTo(259.96, 1)])
  })

  it('is compared with the old one size by size', () => {
    const differences = new Map(answer.differences.map(({ key, from, to }) => [key, [from, to]]))
    expect(differences.get('outerLengthMm')).toEqual([700, 1000])
    expect(differences.get('outerHeightMm')).toEqual([560, 520])
    expect(differences.get('includedPump')).toEqual([old['includedPump'], null])
    expect(differences.has('wallMm')).toBe(false)
  })
})

describe('a tank whose chambers have other names', () => {
  it('has what stood in the old ones put anywhere it has room', () => {
    const named = (id: string) => piece('tank', { ...old, chambers: [{ ...chambers[0], id }] }, `with-${id}`)
    const placed = setup.items.map((one) => (one.id === 'heater' ? { ...one, place: { chamber: 'rear' } } : one))
    const catalogue = catalogueOf(named('back'), named('rear'))
    const result = replacements({ ...setup, items: placed }, 'tank', catalogue, { limit: 10, offset: 0 })!
    expect(result.answers.map(({ knockOns }) => knockOns)).toEqual([[], []])
    // Nor is a rod that has room in none of its chambers forgotten.
    const small = { ...chambers[0], id: 'back', lengthMm: 30, widthMm: 30 }
    const narrow = catalogueOf(piece('tank', { ...old, chambers: [small] }, 'narrow'))
    const [answer] = replacements({ ...setup, items: placed }, 'tank', narrow, { limit: 1, offset: 0 })!.answers
    expect(answer && tellKnockOns(answer)).toContainEqual(['check', 'heater', 'pass', 'fail'])
  })
})

describe('the same longer tank where nothing was said of what carries it', () => {
  it('fits with changes', () => {
    const onFloor = { ...setup, items: setup.items.filter(({ id }) => id !== 'stand') }
    const catalogue = catalogueOf(piece('tank', longer, 'longer-185'))
    const answer = findAnswer(replacements(onFloor, 'tank', catalogue, { limit: 10, offset: 0 })!, 'longer-185')
    expect(answer.verdict).toBe('changes')
    expect(answer.addOns.map(({ need, options }) => [need, options])).toContainEqual(['return-pump', []])
  })
})
