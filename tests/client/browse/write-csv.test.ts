import { describe, expect, it } from 'vitest'
import type { GearItem } from '#shared/schemas/gear'
import { createPrinter } from '#shared/units/print'
import { chooseColumns } from '../../../src/features/browse/model/columns'
import { writeCell, writeCsv } from '../../../src/features/browse/model/write-csv'

const item = (change: Partial<GearItem> = {}): GearItem => ({
  slug: 'invented-short-100',
  kind: 'heater',
  brand: 'Invented',
  model: 'Short 100',
  gtin: null,
  status: 'current',
  revision: 3,
  updatedAt: '2025-03-03T00:00:00.000Z',
  specs: { lengthMm: 254, powerW: 100, form: 'glass-rod' },
  ...change,
})

const columns = chooseColumns('heater', ['form', 'lengthMm', 'diameterMm', 'powerW'])

/** RFC 4180, section 2, read strictly: CRLF ends a record, a quoted field doubles its quotes. */
function parseCsv(text: string): string[][] {
  const records: string[][] = [[]]
  const pattern = /(?:"((?:[^"]|"")*)"|([^",\r\n]*))(,|\r\n|$)/gy
  while (pattern.lastIndex < text.length) {
    const match = pattern.exec(text)
    if (!match) throw new Error(`not RFC 4180 at ${pattern.lastIndex}`)
    const [, quoted, bare = '', end] = match
    records.at(-1)?.push(quoted?.replaceAll('""', '"') ?? bare)
    if (end === '\r\n' && pattern.lastIndex < text.length) records.push([])
  }
  return records
}

describe('a downloaded table', () => {
  it('begins with the mark that tells a spreadsheet it is UTF-8', () => {
    // Unicode 15, section 23.8: U+FEFF; in UTF-8 the bytes EF BB BF.
    const bytes = new TextEncoder().encode(writeCsv([item()], columns, createPrinter('us')))
    expect([...bytes.slice(0, 3)]).toEqual([0xef, 0xbb, 0xbf])
  })

  it('names the unit of every measure in its header and keeps measures numbers in that unit', () => {
    const [headers, row] = parseCsv(writeCsv([item()], columns, createPrinter('us')).slice(1))
    expect(headers).toEqual([
      'Brand',
      'Model',
      'Kind',
      'Form',
      'Length (in)',
      'Diameter (in)',
      'Power (W)',
      'Status',
      'Name in addresses',
      'Revision',
      'Updated',
    ])
    // NIST SP 811, B.8: 254 mm is 10 in.
    expect(row?.slice(3, 7)).toEqual(['glass rod', '10', '', '100'])
    const [metric, metricRow] = parseCsv(writeCsv([item()], columns, createPrinter('metric')).slice(1))
    expect(metric?.[4]).toBe('Length (mm)')
    expect(metricRow?.[4]).toBe('254')
  })

  it('survives commas, quotes and line breaks', () => {
    const odd = item({ brand: 'Inv, "ented"', model: 'two\r\nlines' })
    const [, row] = parseCsv(writeCsv([odd], columns, createPrinter('us')).slice(1))
    expect(row?.slice(0, 2)).toEqual(['Inv, "ented"', 'two\r\nlines'])
  })

  // OWASP, CSV Injection: cells that begin with = + - @ TAB CR or LF, also behind spaces, are run as formulas.
  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\t=1', '\r=1', '\n=1', '  =1', '=HYPERLINK("http://invented.invalid")'])(
    'is never a formula: %j',
    (text) => {
      const [[cell] = []] = parseCsv(writeCell(text))
      expect(cell).toBe(`'${text}`)
    },
  )

  it('leaves numbers below zero numbers', () => {
    expect(writeCell(-1.5)).toBe('-1.5')
    const cold = item({ kind: 'temperature-controller', specs: { rangeMinC: -20 } })
    const [, row] = parseCsv(
      writeCsv([cold], chooseColumns('temperature-controller', ['rangeMinC']), createPrinter('us')).slice(1),
    )
    // -20 °C is -4 °F.
    expect(row?.[3]).toBe('-4')
  })

  it('says nothing, rather than zero, of what is not recorded', () => {
    const [, row] = parseCsv(writeCsv([item({ specs: {} })], columns, createPrinter('us')).slice(1))
    expect(row?.slice(3, 7)).toEqual(['', '', '', ''])
  })
})
