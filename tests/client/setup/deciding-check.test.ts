import { describe, expect, it } from 'vitest'
import type { Check } from '#shared/engine/types'
import { findDecidingCheck } from '../../../src/components/setup/deciding-check'

const check = (id: string, part: Partial<Check>): Check => ({
  id,
  label: id,
  outcome: 'pass',
  measured: 1,
  limit: 2,
  unit: 'mm',
  margin: 0.5,
  message: '',
  basis: { type: 'practice', source: '' },
  ...part,
})

describe('the check that decides for a piece', () => {
  it('is the failing one, however little the others have to spare', () => {
    const checks = [check('a', { margin: 0.01 }), check('b', { outcome: 'fail', margin: -0.2 })]
    expect(findDecidingCheck(checks)?.id).toBe('b')
  })

  it('is the one with least to spare where all pass', () => {
    const checks = [check('a', { margin: 0.4 }), check('b', { margin: null }), check('c', { margin: 0.1 })]
    expect(findDecidingCheck(checks)?.id).toBe('c')
  })

  it('is a close call before a small but certain margin', () => {
    const checks = [check('a', { margin: 0.02 }), check('b', { margin: 0.3, probability: 0.7 })]
    expect(findDecidingCheck(checks)?.id).toBe('b')
  })

  it('is none where nothing was checked', () => {
    expect(findDecidingCheck([])).toBeUndefined()
  })
})
