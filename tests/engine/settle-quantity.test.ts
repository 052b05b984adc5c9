import { describe, expect, it } from 'vitest'
import { replacements } from '#shared/engine/swap/replacements'
import { heater, item, wholeSetup } from './build'
import { catalogueOf } from './demo-catalogue'

const page = { limit: 10, offset: 0 }

/** What takes the place of so many 50 W heaters. */
function swap(quantity: number, ...powers: readonly number[]) {
  const old = heater({ powerW: 50, lengthMm: 200 }, 'old')
  const setup = wholeSetup({}, { items: [item('gone', old, { quantity, state: 'gone' })] })
  const candidates = powers.map((powerW) => heater({ powerW, lengthMm: 200 }, `w${powerW}`))
  const { answers } = replacements(setup, 'gone', catalogueOf(...candidates), page)!
  return answers.map(({ gear, verdict, pieces, knockOns }) => ({
    slug: gear?.slug,
    verdict,
    quantity: pieces[0]?.quantity,
    demands: knockOns.filter(({ kind }) => kind === 'need' || kind === 'check').map(({ subject }) => subject),
  }))
}

describe('how many take the place of several that are gone', () => {
  // 84 L take some 84 to 100 W, and up to 2.0 times that or 1.5 W per litre (125 W) without a second cut-off.
  it('is one where two would ask for something and one fits', () => {
    expect(swap(2, 100)).toEqual([{ slug: 'w100', verdict: 'fits', quantity: 1, demands: [] }])
  })

  it('is as many as there were where they simply fit', () => {
    expect(swap(2, 55)).toEqual([{ slug: 'w55', verdict: 'fits', quantity: 2, demands: [] }])
  })

  it('is the most of it that fits, not at once one', () => {
    // 180 W take a second cut-off, 120 W do not, and 60 W are less than the tank loses.
    expect(swap(3, 60).map(({ verdict, quantity }) => [verdict, quantity])).toEqual([['fits', 2]])
  })

  it('is one of a piece of which even two are far too strong', () => {
    expect(swap(2, 200)).toEqual([{ slug: 'w200', verdict: 'changes', quantity: 1, demands: ['second-cut-off'] }])
  })
})
