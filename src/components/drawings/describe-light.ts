import type { LightDrawing } from '#shared/engine/drawings/light'
import type { Printer } from '#shared/units/print'

/** Whole percents that add up to a hundred. */
export function splitPlane({ share, aboveShare }: LightDrawing) {
  const within = Math.round(share * 100)
  const above = Math.min(100 - within, Math.round(aboveShare * 100))
  return { within, above, below: 100 - within - above }
}

export function printPlane({ depthMm, isDepthGiven }: LightDrawing, printer: Printer): string {
  return isDepthGiven ? `Light ${printer.length(depthMm)} down` : 'Light half way down'
}

export function printSetting({ percent }: LightDrawing, printer: Printer): string {
  return percent === 100 ? 'at full power' : `at ${printer.measure(percent / 100, 'fraction')} power`
}

export function printLights({ fixtures, heightMm, isHeightGiven }: LightDrawing, printer: Printer): string {
  const lens = `${printer.length(heightMm)} above the water${isHeightGiven ? '' : ' (assumed)'}`
  return fixtures.length === 1 ? `the light, lens ${lens}` : `${fixtures.length} lights, lenses ${lens}`
}

export function printSpill({ spill }: LightDrawing, printer: Printer): string {
  return `${printer.measure(Math.round(spill * 100) / 100, 'fraction')} of the light misses the water.`
}

/** The text alternative of a light map. */
export function describeLight(drawing: LightDrawing, printer: Printer): string {
  const { band, display, depthMm, brightestUmol } = drawing
  const { within, above, below } = splitPlane(drawing)
  const percent = (share: number) => printer.measure(share / 100, 'fraction')
  return [
    `The display, ${printer.size([display.lengthMm, display.widthMm])}, seen from above, back wall at the top, with ${printLights(drawing, printer)}.`,
    `On a plane ${printer.length(depthMm)} under the water, ${printSetting(drawing, printer)}:`,
    `${percent(within)} is in the band of ${printer.pair(band, 'umol/m2/s')}, ${percent(above)} is brighter, ${percent(below)} dimmer;`,
    `the brightest point gets ${printer.measure(brightestUmol, 'umol/m2/s')}.`,
    printSpill(drawing, printer),
    'Reflections are left out; an estimate.',
  ].join(' ')
}
