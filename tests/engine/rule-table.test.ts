import { UcumLhcUtils } from '@lhncbc/ucum-lhc'
import { describe, expect, it } from 'vitest'
import { listRules } from '#shared/engine/checks/index'
import { thresholds } from '#shared/engine/thresholds'
import { getAttribute, isKindKey } from '#shared/kinds/index'
import { findSetupField } from '#shared/kinds/setup-fields'
import { units } from '#shared/units/units'

const ucum = UcumLhcUtils.getInstance()
const rules = listRules()

/** Published: outside users and saved links go by them. They may be added to and never change. */
const ids = `
tank.volume tank.filtration tank.return-pump tank.support tank.support-load tank.made-for
stand.footprint stand.load
light.coverage light.intensity light.body light.spectrum light.mount light.control light.mains light.plugs light.load light.made-for
light-mount.lamp light-mount.load light-mount.tank
light-controller.group light-controller.mains light-controller.plugs light-controller.load
heater.space heater.power heater.not-too-strong heater.rated-volume heater.thermostat heater.mains heater.plugs heater.load heater.made-for
temperature-controller.load temperature-controller.outlets temperature-controller.range temperature-controller.mains temperature-controller.plugs
return-pump.flow return-pump.space return-pump.bore return-pump.mains return-pump.plugs return-pump.load return-pump.made-for
wavemaker.flow wavemaker.wall wavemaker.sand wavemaker.mains wavemaker.plugs wavemaker.load wavemaker.made-for
skimmer.space skimmer.depth skimmer.rating skimmer.mains skimmer.plugs skimmer.load skimmer.made-for
auto-top-off.space auto-top-off.lift auto-top-off.mains auto-top-off.plugs auto-top-off.load
rock.amount rock.state rock.made-for
sand.mineral sand.grain sand.amount sand.magnetic sand.state sand.made-for
ro-unit.stages ro-unit.output ro-unit.pressure
booster-pump.pressure booster-pump.inlet booster-pump.flow booster-pump.mains booster-pump.plugs booster-pump.load
salinity-meter.scale salinity-meter.range salinity-meter.resolution
test-kit.coverage test-kit.made-for
salt-mix.amount salt-mix.made-for
scraper.wall scraper.acrylic scraper.reach
siphon.reach siphon.hose
net.size
power-strip.outlets power-strip.load power-strip.rated-voltage power-strip.switched power-strip.mains
`
  .trim()
  .split(/\s+/)

describe('the table of rules', () => {
  it('keeps every published id', () => {
    const known = rules.map(({ id }) => id)
    expect(new Set(known).size).toBe(known.length)
    expect([...known].sort()).toEqual([...ids].sort())
  })

  it('reads attributes that its kind has', () => {
    for (const { id, reads } of rules) {
      const kind = id.split('.')[0] ?? ''
      expect(isKindKey(kind), id).toBe(true)
      for (const key of reads) expect(isKindKey(kind) && getAttribute(kind, key), `${id} reads ${key}`).toBeTruthy()
      expect(reads.length, id).toBeGreaterThan(0)
      expect(new Set(reads).size, id).toBe(reads.length)
    }
  })

  it('rests on paths that a setup has', () => {
    for (const { id, uses } of rules)
      for (const path of uses) {
        const known = path === 'goals.turnoverPerHour' || findSetupField(path.replace('*', '0'))
        expect(known, `${id} uses ${path}`).toBeTruthy()
      }
  })

  it('measures in units that UCUM knows', () => {
    for (const { id, unit } of rules)
      if (unit !== null) expect(ucum.validateUnitString(units[unit].ucum).status, id).toBe('valid')
  })

  it('says for each where it comes from, what it is and how it is counted', () => {
    for (const { id, label, basis, rule, failLabel } of rules) {
      expect(['physics', 'standard', 'practice'], id).toContain(basis.type)
      expect(basis.source.length, id).toBeGreaterThan(10)
      expect(label, id).toMatch(/^[A-Z]/)
      expect(rule, id).toMatch(/^[A-Z0-9].*\.$/s)
      expect(failLabel, id).toMatch(/^[a-z].*[^.]$/)
    }
  })

  it('names a number of common practice as that, and of the electrical code by its article', () => {
    const { continuousShare, ...rest } = thresholds
    expect(continuousShare).toMatchObject({ value: 0.8, basis: { type: 'standard' } })
    expect(continuousShare.basis.source).toContain('NEC')
    for (const [key, { basis }] of Object.entries(rest)) expect(basis.type, key).not.toBe('standard')
  })
})
