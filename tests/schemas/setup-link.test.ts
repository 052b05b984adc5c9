import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { setupFields } from '../../shared/kinds/setup-fields'
import { setupSchema } from '../../shared/schemas/setup'
import { readSetupLink, writeSetupLink } from '../../shared/schemas/setup-link'
import type { UnitSystem } from '../../shared/units/systems'

const read = (query: string, system: UnitSystem = 'us') => readSetupLink(new URLSearchParams(query), system)
const write = (query: string, system: UnitSystem = 'us') => writeSetupLink(new URLSearchParams(query), system)

describe('reading a link', () => {
  it('reads sizes as typed: 24 in is 609.6 mm (the inch is 25.4 mm, NIST SP 811 B.8)', () => {
    const { setup, problems } = read('tank.outerLengthMm=24in&tank.outerWidthMm=16"&tank.outerHeightMm=35.56cm')
    expect(problems).toEqual([])
    expect(setup.tank).toEqual({ outerLengthMm: 609.6, outerWidthMm: 406.4, outerHeightMm: 355.6 })
  })

  it('reads volumes and temperatures as typed: 20 gal is 75.708 L, 78 °F is 25.56 °C (NIST SP 811 B.8)', () => {
    const { setup } = read('tank.volumeL=20+gal&goals.temperatureC=78F&room.coldestC=64.4°F')
    expect(setup.tank.volumeL).toBeCloseTo(75.70823568, 8)
    expect(setup.goals?.temperatureC).toBeCloseTo((78 - 32) / 1.8, 10)
    expect(setup.room?.coldestC).toBeCloseTo(18, 10)
  })

  it('takes a bare number as canonical, whoever reads it', () => {
    for (const system of ['us', 'metric'] as const) {
      const { setup } = read(
        'tank.outerLengthMm=600&tank.volumeL=75.7&room.relativeHumidity=0.5&goals.temperatureC=25',
        system,
      )
      expect(setup.tank).toEqual({ outerLengthMm: 600, volumeL: 75.7 })
      expect(setup.room).toEqual({ relativeHumidity: 0.5 })
      expect(setup.goals).toEqual({ temperatureC: 25 })
    }
  })

  it('takes a bare number of a form as the person’s own unit, and writes that unit down', () => {
    const query = 'typed=us&tank.outerLengthMm=24&goals.temperatureC=78&mains.outlets=3'
    expect(read(query).setup.tank).toEqual({ outerLengthMm: 609.6 })
    const canonical = write(query)
    expect(decodeURIComponent(canonical)).toBe('tank.outerLengthMm=24 in&mains.outlets=3&goals.temperatureC=78 °F')
    expect(read(canonical).setup).toEqual(read(query).setup)
  })

  it('finds chambers by place or by id', () => {
    const byPlace = read('tank.chambers.0.lengthMm=4in&tank.chambers.0.id=rear&tank.chambers.1.lengthMm=5in')
    expect(byPlace.setup.tank.chambers).toEqual([
      { id: 'rear', lengthMm: 101.6 },
      { id: 'rear-2', lengthMm: 127 },
    ])
    const byId = read('tank.chambers.rear.lengthMm=4in&tank.chambers.rear.waterDepthMm=12in')
    expect(byId.setup.tank.chambers).toEqual([{ id: 'rear', lengthMm: 101.6, waterDepthMm: 304.8 }])
    expect(byId.raw['tank.chambers.0.lengthMm']).toBe('4in')
  })

  it('reads choices, sets, yes and no, and goals in pairs', () => {
    const { setup, problems } = read(
      'mains.volts=120&mains.plugType=A/B&mains.residualCurrentProtected=yes&goals.coral=soft,lps&goals.turnoverPerHour.0=4&goals.turnoverPerHour.1=10&support.kind=stand&country=US',
    )
    expect(problems).toEqual([])
    expect(setup.mains).toEqual({ volts: 120, plugType: 'A/B', residualCurrentProtected: true })
    expect(setup.goals).toEqual({ coral: ['soft', 'lps'], turnoverPerHour: [4, 10] })
  })

  it('tells no corals from corals not said, and joins the boxes of a form', () => {
    expect(read('goals.coral=none').setup.goals).toEqual({ coral: [] })
    expect(read('room.coldestC=18').setup.goals).toBeUndefined()
    expect(read('goals.coral=soft&goals.coral=sps').setup.goals).toEqual({ coral: ['soft', 'sps'] })
  })

  it('reads a piece of which only the kind is told, and groups of its numbers by place', () => {
    const { setup, problems } = read(
      'items.net.kind=net&items.pump.kind=return-pump&items.pump.specs.flowCurve.0.headM=0&items.pump.specs.flowCurve.0.flowLph=2000L/h&items.pump.specs.flowCurve.1.headM=6ft&items.pump.specs.flowCurve.1.flowLph=0',
    )
    expect(problems).toEqual([])
    expect(setup.items).toEqual([
      { id: 'net', kind: 'net', specs: {} },
      {
        id: 'pump',
        kind: 'return-pump',
        // The foot is 0.3048 m (NIST SP 811 B.8).
        specs: {
          flowCurve: [
            { headM: 0, flowLph: 2000 },
            { headM: 1.8288, flowLph: 0 },
          ],
        },
      },
    ])
    expect(setupSchema.safeParse({ ...setup, tank: { volumeL: 75 } }).success).toBe(true)
    expect(read('items.pump.kind=return-pump&items.pump.specs.flowCurve.headM=1').problems).toHaveLength(1)
    expect(read('items.pump.kind=return-pump&items.pump.specs.flowCurve.0=1').problems).toHaveLength(1)
  })

  it('reads items with their gear or their specs', () => {
    const { setup, problems } = read(
      'items.heater.gear=some-heater&items.heater.place=rear&items.light.kind=light&items.light.specs.powerW=60W&items.light.mountHeightMm=8in&items.light.state=planned&items.kits.kind=test-kit&items.kits.specs.parameters=ammonia,nitrite&items.kits.quantity=2&items.kits.place=cabinet',
    )
    expect(problems).toEqual([])
    expect(setup.items).toEqual([
      { id: 'heater', gear: 'some-heater', place: { chamber: 'rear' } },
      { id: 'light', kind: 'light', specs: { powerW: 60 }, mountHeightMm: 203.2, state: 'planned' },
      {
        id: 'kits',
        kind: 'test-kit',
        specs: { parameters: ['ammonia', 'nitrite'] },
        quantity: 2,
        place: { in: 'cabinet' },
      },
    ])
  })

  it('keeps every text that it cannot read, and says why', () => {
    const { setup, problems, raw } = read(
      'tank.outerLengthMm=20+gal&tank.wallMm=thick&mains.volts=9000&tank.colour=red&units=us',
    )
    expect(setup.tank).toEqual({})
    expect(Object.fromEntries(problems.map(({ path, text }) => [path, text]))).toEqual({
      'tank.outerLengthMm': '20 gal',
      'tank.wallMm': 'thick',
      'mains.volts': '9000',
      'tank.colour': 'red',
    })
    expect(problems.every(({ detail }) => detail !== '')).toBe(true)
    expect(raw['tank.outerLengthMm']).toBe('20 gal')
  })

  it('refuses what lies outside every plausible tank', () => {
    const { problems } = read('tank.outerLengthMm=1mm')
    expect(problems[0]?.detail).toMatch(/between 100 and 6000 mm/)
  })

  it('keeps the unit that a form’s number was meant in, also where the number is out of the question', () => {
    const typed = 'typed=us&tank.outerHeightMm=3&tank.outerWidthMm=-12'
    const { raw, problems } = read(typed)
    expect(problems.map(({ path }) => path)).toEqual(['tank.outerWidthMm', 'tank.outerHeightMm'])
    expect(raw['tank.outerHeightMm']).toBe('3 in')
    expect(writeSetupLink(new URLSearchParams(typed), 'us')).toContain('tank.outerHeightMm=3%20in')
  })

  it('knows countries however they are written, and refuses what is none (ISO 3166-1)', () => {
    expect(read('country=gb').setup).toMatchObject({ country: 'GB' })
    expect(read('country=UK').setup).toMatchObject({ country: 'GB' })
    expect(read('country=usa').setup).toMatchObject({ country: 'US' })
    for (const none of ['ZZ', 'EU', 'XX', 'England'])
      expect(
        read(`country=${none}`).problems.map(({ path }) => path),
        none,
      ).toEqual(['country'])
  })

  it('passes over keys of the page and empty fields', () => {
    const link = read('kind=heater&verdict=fits&utm=1&tank.wallMm=&tank.volumeL=75')
    expect(link.raw).toEqual({ 'tank.volumeL': '75' })
    expect(link.problems).toEqual([])
  })

  it('reads nothing into prototypes', () => {
    read(
      'tank.__proto__.polluted=1&__proto__.polluted=1&items.__proto__.gear=x&items.constructor.gear=y&tank.chambers.__proto__.lengthMm=1',
    )
    expect(({} as Record<string, unknown>).polluted).toBeUndefined()
    expect(({} as Record<string, unknown>).gear).toBeUndefined()
  })

  it('does not read a link of more than 6 kB, and says so without losing it', () => {
    const query = `name=${'x'.repeat(7000)}`
    const link = read(query)
    expect(link.problems).toHaveLength(1)
    expect(link.problems[0]?.detail).toMatch(/6 kB/)
    expect(link.raw.name).toHaveLength(7000)
  })

  it('gives a setup that the API takes', () => {
    const { setup } = read(
      'tank.volumeL=20gal&tank.chambers.rear.lengthMm=4in&goals.coral=soft&items.a.gear=some-heater&room.coldestC=60F',
    )
    expect(setupSchema.safeParse(setup).success).toBe(true)
  })
})

describe('writing a link', () => {
  it('puts keys in the order of the form, whatever order they came in', () => {
    const parts = [
      'units=us',
      'tank.volumeL=20gal',
      'tank.chambers.0.id=rear',
      'tank.chambers.0.lengthMm=4in',
      'goals.temperatureC=78F',
      'items.a.gear=some-heater',
    ]
    expect(write([...parts].reverse().join('&'))).toBe(write(parts.join('&')))
    expect(write(parts.join('&'))).toBe(parts.join('&'))
  })

  it('keeps what could not be read', () => {
    expect(decodeURIComponent(write('tank.wallMm=thick'))).toBe('tank.wallMm=thick')
  })

  const paths = setupFields.map(({ path }) => path.replace('*', '0'))
  const texts = fc.oneof(
    fc.string({ maxLength: 30 }),
    fc.constantFrom(
      '24in',
      '4 1/2"',
      '1\' 6"',
      '20 gal',
      '78 °F',
      '½',
      'yes',
      'none',
      'soft,lps',
      '120',
      '0.5',
      'A/B',
      '-3',
    ),
  )
  const queries = fc
    .array(fc.tuple(fc.oneof(fc.constantFrom(...paths), fc.string({ maxLength: 20 })), texts), { maxLength: 12 })
    .map((entries) => new URLSearchParams(entries))

  it('changes nothing the second time, and reads back as the same setup', () => {
    fc.assert(
      fc.property(queries, fc.constantFrom<UnitSystem>('us', 'metric'), (query, system) => {
        const once = writeSetupLink(query, system)
        const again = new URLSearchParams(once)
        expect(writeSetupLink(again, system)).toBe(once)
        expect(readSetupLink(again, system).setup).toEqual(readSetupLink(query, system).setup)
        expect(readSetupLink(again, system).problems).toEqual(readSetupLink(query, system).problems)
      }),
      { numRuns: 300 },
    )
  })
})
