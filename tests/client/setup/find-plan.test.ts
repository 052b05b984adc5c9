import { describe, expect, it } from 'vitest'
import type { Setup } from '#shared/engine/types'
import { findPlan } from '../../../src/components/setup/find-plan'

const of = (specs: Readonly<Record<string, number>>): Setup => ({
  units: 'metric',
  tank: {
    specs: Object.fromEntries(Object.entries(specs).map(([key, value]) => [key, { value, source: 'measured' }])),
  },
  items: [],
})

describe('the tank that is drawn before enough is said of it', () => {
  it('is one of 75.7 L where nothing is', () => {
    const { plan, isExample } = findPlan(of({}))
    expect(isExample).toBe(true)
    expect(plan.tank.ratedL).toBe(75.7)
  })

  it.each([
    { outerLengthMm: 1524 },
    { outerHeightMm: 400 },
    { outerWidthMm: 300 },
    { outerLengthMm: 600, outerWidthMm: 450 },
  ])('keeps the sides that are known, and has the shape of a tank: %o', (known) => {
    const { plan, isExample } = findPlan(of(known))
    const { outerLengthMm: length, outerWidthMm: width, outerHeightMm: height } = plan.tank
    expect(isExample).toBe(true)
    expect(plan.tank).toMatchObject(known)
    expect(Math.max(length, width, height) / Math.min(length, width, height)).toBeLessThan(4)
  })
})
