import { describe, expect, it } from 'vitest'
import type { Setup } from '#shared/engine/types'
import { fitCheck } from '#shared/engine/fit'
import { item, judge, piece, toPlain, wholeSetup } from '../build'

type Values = Readonly<Record<string, unknown>>

const lamp = (values: Values = {}, id = 'lamp') =>
  item(id, piece('light', { mountsIncluded: [], mountsPossible: ['arm'], massKg: 1.2, heightMm: 40, ...values }))
const mount = (values: Values = {}) =>
  piece('light-mount', { type: 'arm', maxLoadKg: 2, rimMinMm: 4, rimMaxMm: 12, ...values })
const check = (id: string, values: Values, items: Setup['items'] = [lamp()], rest: Partial<Setup> = {}) =>
  judge(wholeSetup({}, { items, ...rest }), mount(values), `light-mount.${id}`)

describe('a light mount', () => {
  it('is of a sort that the setup’s light takes', () => {
    expect(check('lamp', {}).outcome).toBe('pass')
    expect(check('lamp', {}, [lamp({ mountsIncluded: ['arm'], mountsPossible: [] })]).outcome).toBe('pass')
    expect(check('lamp', { type: 'hanging' })).toMatchObject({
      outcome: 'fail',
      message: 'The light does not take a hanging kit.',
    })
    expect(check('lamp', { type: undefined })).toMatchObject({ outcome: 'nodata', missing: ['type'] })
  })

  it('is not ruled out by what nobody recorded of the light', () => {
    expect(check('lamp', { type: 'hanging' }, [lamp({ mountsIncluded: undefined })]).outcome).toBe('nodata')
    expect(check('lamp', {}, [lamp({ mountsIncluded: undefined })]).outcome).toBe('pass')
  })

  it('carries the light, the heaviest of several', () => {
    expect(check('load', { maxLoadKg: 1.2 }).outcome).toBe('pass')
    expect(check('load', { maxLoadKg: 1.19 }).outcome).toBe('fail')
    expect(check('load', { maxLoadKg: 1.5 }, [lamp(), lamp({ massKg: 1.6 }, 'other')]).outcome).toBe('fail')
    expect(check('load', { maxLoadKg: undefined })).toMatchObject({ outcome: 'nodata', missing: ['maxLoadKg'] })
    expect(check('load', {}, [lamp({ massKg: undefined })]).outcome).toBe('nodata')
  })

  it('is not told to fit where there is no light to hold it against', () => {
    expect(check('lamp', {}, []).outcome).toBe('nodata')
    expect(check('load', {}, []).outcome).toBe('nodata')
    expect(fitCheck(wholeSetup(), mount()).verdict).toBe('unknown')
  })

  it('clamps the wall of 10 mm', () => {
    expect(check('tank', { rimMinMm: 10, rimMaxMm: 10 }).outcome).toBe('pass')
    expect(check('tank', { rimMaxMm: 9.9 }).outcome).toBe('fail')
    expect(check('tank', { rimMinMm: 10.1 }).outcome).toBe('fail')
    expect(check('tank', { rimMinMm: undefined })).toMatchObject({ outcome: 'nodata', missing: ['rimMinMm'] })
  })

  it('spans the tank’s 620 or 420 mm', () => {
    const legs = (spanMinMm: number | undefined, spanMaxMm: number | undefined) =>
      check('tank', { type: 'rim-legs', spanMinMm, spanMaxMm }).outcome
    expect(legs(500, 620)).toBe('pass')
    expect(legs(420, 600)).toBe('pass')
    expect(legs(430, 610)).toBe('fail')
    expect(legs(undefined, 700)).toBe('nodata')
    expect(legs(undefined, 400)).toBe('fail')
  })

  it('has the height of lens and light under the ceiling, and says where the light’s is not known', () => {
    // Rim at 1150, lens 200 above, 40 of lamp.
    const under = (ceilingMm: number, heightMm: number | undefined = 40) => {
      const room = { ...wholeSetup().room, ceilingMm }
      return fitCheck(wholeSetup({}, { room, items: [lamp({ heightMm })] }), mount({ type: 'ceiling' }))
    }
    const outcome = (ceilingMm: number) => under(ceilingMm).checks.find(({ id }) => id === 'light-mount.tank')?.outcome
    expect(outcome(1390)).toBe('pass')
    expect(outcome(1389)).toBe('fail')
    const items = [lamp({ heightMm: undefined })]
    expect(fitCheck(wholeSetup({}, { items }), mount({ type: 'ceiling' })).cautions).toContain(
      '1 piece in the setup states no height and could not be counted.',
    )
    expect(under(2400).cautions.join(' ')).not.toContain('states no height')
  })

  it('cannot be told to fit where it is a canopy', () => {
    expect(check('tank', { type: 'canopy' }).outcome).toBe('nodata')
  })

  it('is not condemned by a ceiling that was assumed', () => {
    const { ceilingMm: _, ...room } = wholeSetup().room ?? {}
    const found = check('tank', { type: 'hanging' }, [lamp()], { room: { ...room, tankTopMm: 2300 } })
    expect(found.outcome).toBe('change')
    expect(toPlain(found.message)).toContain('It works if the ceiling height is at least 2540 mm; we assumed 2400 mm.')
  })
})

describe('a light controller', () => {
  const controller = piece('light-controller', { controlGroup: 'Tide' })
  const group = (...lights: readonly Values[]) =>
    judge(
      wholeSetup({}, { items: lights.map((values, index) => lamp(values, `lamp-${index}`)) }),
      controller,
      'light-controller.group',
    )

  it('speaks to lights of its own group', () => {
    expect(group({ control: 'controller-needed', controlGroup: 'Tide' }).outcome).toBe('pass')
    expect(group({ control: 'controller-needed', controlGroup: 'Reefline' }).outcome).toBe('fail')
    expect(group({ controlGroup: 'Reefline' }, { controlGroup: 'Tide' }).outcome).toBe('pass')
  })

  it('is of no use to a light that takes none', () => {
    expect(group({ control: 'on-off' })).toMatchObject({
      outcome: 'fail',
      message: 'Speaks to lights of the Tide group, and yours takes no controller.',
    })
  })

  it('is no data where a light’s group is not known, or there is no light', () => {
    expect(group({ controlGroup: 'Reefline' }, { control: 'controller-needed' }).outcome).toBe('nodata')
    expect(group().outcome).toBe('nodata')
    const unnamed = piece('light-controller', {})
    expect(judge(wholeSetup(), unnamed, 'light-controller.group')).toMatchObject({ missing: ['controlGroup'] })
  })
})
