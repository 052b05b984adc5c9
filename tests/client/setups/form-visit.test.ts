import { describe, expect, it } from 'vitest'
import { readFormVisit } from '../../../src/features/setups/link/read-form-visit'

const read = (query: string) => readFormVisit(new URLSearchParams(query), 'us')

/** Where the form goes on, decoded. */
const redirectOf = (query: string) => decodeURIComponent(read(query).redirect ?? '')

describe('the address of the form', () => {
  it('is left alone where it is spelt as it would be written', () => {
    expect(read('').redirect).toBeUndefined()
    expect(read('tank.volumeL=20%20gal').redirect).toBeUndefined()
  })

  it('writes the unit of a sent form beside each bare number, and drops what was left empty', () => {
    expect(redirectOf('typed=us&tank.volumeL=20&room.coldestC=&kind=stand&find=&findTank=')).toBe(
      '/setups/new?tank.volumeL=20 gal',
    )
  })

  it('adds a piece of the catalogue, gives a second one of its kind a name of its own, and leads to it', () => {
    expect(redirectOf('items.heater.kind=heater&items.heater.gear=one&add=heater.two')).toBe(
      '/setups/new?items.heater.kind=heater&items.heater.gear=one&items.heater-2.kind=heater&items.heater-2.gear=two#item-heater-2',
    )
  })

  it('adds a piece to be described, by its kind', () => {
    expect(redirectOf('add=own&kind=net')).toBe('/setups/new?items.net.kind=net#item-net')
  })

  it('takes a tank for the tank rather than for a piece in it', () => {
    expect(redirectOf('tank.volumeL=20%20gal&add=tank.some-tank')).toBe(
      '/setups/new?tank.gear=some-tank&tank.volumeL=20 gal#tank',
    )
    expect(redirectOf('tank.gear=some-tank&tank.volumeL=20%20gal&drop=tank')).toBe(
      '/setups/new?tank.volumeL=20 gal#tank',
    )
  })

  it('takes a piece out with all that was said of it', () => {
    expect(redirectOf('items.a.kind=net&items.a.specs.openingMm=4in&items.b.kind=net&drop=a')).toBe(
      '/setups/new?items.b.kind=net#gear',
    )
  })

  it('asks about as many chambers as are told of, one more when asked, and never about none', () => {
    expect(read('').chambers).toBe(1)
    expect(read('tank.chambers.0.lengthMm=4in&tank.chambers.1.lengthMm=4in').chambers).toBe(2)
    expect(redirectOf('more=chamber')).toBe('/setups/new?chambers=2#chamber-1')
    expect(read('chambers=99').chambers).toBe(12)
  })

  it('keeps what cannot be read, and does nothing for a button that does not exist', () => {
    const { visit, redirect } = read('tank.volumeL=soon&add=heater')
    expect(visit.raw['tank.volumeL']).toBe('soon')
    expect(visit.problems.map(({ path }) => path)).toEqual(['tank.volumeL'])
    expect(redirect).toBeUndefined()
  })
})
