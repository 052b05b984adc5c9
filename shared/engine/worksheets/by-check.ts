/** The worksheet that works a check's numbers out, by the check's id. */
const sheetByCheck: Readonly<Record<string, string>> = {
  'heater.power': 'heat-balance',
  'heater.not-too-strong': 'heat-balance',
  'heater.space': 'rod-in-chamber',
  'light.intensity': 'light-map',
  'light.coverage': 'light-map',
  'return-pump.flow': 'pump-point',
  'stand.load': 'filled-weight',
  'tank.support': 'filled-weight',
  'ro-unit.output': 'membrane',
  'sand.amount': 'sand-bed',
  'sand.grain': 'sand-bed',
  'salt-mix.amount': 'salt-mix',
  'salinity-meter.scale': 'seawater',
  'power-strip.load': 'power-load',
  'light.load': 'power-load',
  'light-controller.load': 'power-load',
  'heater.load': 'power-load',
  'return-pump.load': 'power-load',
  'wavemaker.load': 'power-load',
  'skimmer.load': 'power-load',
  'auto-top-off.load': 'power-load',
  'booster-pump.load': 'power-load',
}

export const findSheetOf = (checkId: string): string | undefined =>
  Object.hasOwn(sheetByCheck, checkId) ? sheetByCheck[checkId] : undefined
