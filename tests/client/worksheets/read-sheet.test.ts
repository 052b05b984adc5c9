import { describe, expect, it } from 'vitest'
import { findWorksheet } from '#shared/engine/worksheets/registry'
import { readSheet } from '../../../src/features/worksheets/link/read-sheet'
import { readVisit } from '../../../src/features/worksheets/link/read-visit'
import { solveSheet } from '../../../src/features/worksheets/model/solve-sheet'
import { writeExample } from '../../../src/features/worksheets/model/write-example'
import { worksheets } from '#shared/engine/worksheets/registry'
import { createPrinter } from '#shared/units/print'

const sheetOf = (name: string) => findWorksheet(name)!
const read = (name: string, query: string, typedIn?: 'us' | 'metric') =>
  readSheet(sheetOf(name), new URLSearchParams(query), 'us', typedIn)

describe('the inputs of a worksheet in its address', () => {
  it('takes a bare number of a link as canonical, and one of a form in the person’s own unit', () => {
    // 1 in is 25.4 mm exactly.
    expect(read('sand-bed', 'lengthMm=100').values).toEqual({ lengthMm: 100 })
    expect(read('sand-bed', 'lengthMm=10', 'us').values).toEqual({ lengthMm: 254 })
    expect(read('sand-bed', 'lengthMm=10', 'us').query).toBe('lengthMm=10%20in')
    expect(read('sand-bed', 'lengthMm=4 1/2"').values).toEqual({ lengthMm: 114.3 })
  })

  it('keeps what cannot be read, and says what is still needed', () => {
    const { problems, texts, needed, query } = read('sand-bed', 'lengthMm=soon&packKg=-3')
    expect(problems.map(({ path, text }) => [path, text])).toEqual([
      ['lengthMm', 'soon'],
      ['packKg', '-3'],
    ])
    expect(texts).toEqual({ lengthMm: 'soon', packKg: '-3' })
    expect(query).toContain('lengthMm=soon')
    expect(needed.map(({ path }) => path)).toEqual(['widthMm', 'depthMm'])
  })

  it('numbers the rows of a list anew, and leaves out empty ones', () => {
    const { values, query } = read('pump-point', 'flowCurve.0.flowLph=&flowCurve.3.flowLph=900&flowCurve.1.headM=2 m')
    expect(values).toEqual({ flowCurve: [{ headM: 2 }, { flowLph: 900 }] })
    expect(query).toBe('flowCurve.0.headM=2%20m&flowCurve.1.flowLph=900')
  })

  it('takes the parts of a setup that belong to it, and passes other keys over', () => {
    const { setup, values, query } = read(
      'heat-balance',
      'heaterW=100&tank.volumeL=75&room.coldestC=16&mains.volts=120&x=1',
    )
    expect(values).toEqual({ heaterW: 100 })
    expect(setup).toMatchObject({ tank: { volumeL: 75 }, room: { coldestC: 16 } })
    expect(query).toBe('heaterW=100&tank.volumeL=75&room.coldestC=16')
  })

  it('joins the boxes of one set', () => {
    expect(read('light-map', 'coral=soft&coral=lps').values).toEqual({ coral: ['soft', 'lps'] })
    expect(read('light-map', 'coral=none').values).toEqual({ coral: [] })
  })

  it.each(worksheets.map((sheet) => [sheet.name, sheet] as const))(
    'writes the example of %s as an address that reads the same, in both unit systems',
    (_, sheet) => {
      for (const system of ['us', 'metric'] as const) {
        const printer = createPrinter(system)
        const example = solveSheet(sheet, writeExample(sheet, printer), printer)
        expect([...example.errors], sheet.name).toEqual([])
        expect(example.needed).toEqual([])
        expect(example.working?.steps.length).toBeGreaterThan(1)
        const again = readSheet(sheet, new URLSearchParams(example.read.query), system)
        expect(again.query).toBe(example.read.query)
        expect(again.values).toEqual(example.read.values)
        expect(again.setup).toEqual(example.read.setup)
      }
    },
  )
})

describe('a visit to a worksheet', () => {
  const visit = (name: string, query: string) => readVisit(sheetOf(name), new URLSearchParams(query), 'us')

  it('shows the example where nothing is said, and an empty form where one is asked for', () => {
    expect(visit('salt-mix', '')).toMatchObject({ isEmpty: true, isCleared: false, isToFill: false })
    expect(visit('salt-mix', '').redirect).toBeUndefined()
    expect(visit('salt-mix', 'clear=yes')).toMatchObject({ isEmpty: true, isCleared: true })
    expect(visit('salt-mix', 'typed=us&volumeL=').redirect).toBe('clear=yes')
  })

  it('leads a form that was sent to its canonical address', () => {
    expect(visit('salt-mix', 'typed=us&volumeL=20&makesL=').redirect).toBe('volumeL=20%20gal')
    expect(visit('salt-mix', 'volumeL=20+gal').redirect).toBeUndefined()
  })

  it('is to be filled in where the address names a setup that the sheet does not take as it is', () => {
    expect(visit('salt-mix', 'tank.volumeL=75').isToFill).toBe(true)
    expect(visit('heat-balance', 'tank.volumeL=75').isToFill).toBe(false)
    expect(visit('heat-balance', 'tank.gear=some-tank').isToFill).toBe(true)
    expect(visit('power-load', 'items.0.powerW=100').isToFill).toBe(false)
    expect(visit('power-load', 'items.heater.kind=heater').isToFill).toBe(true)
  })
})
