import type { HeatDayDrawing } from '#shared/engine/drawings/heat-day'
import type { Printer } from '#shared/units/print'

export function printHeld({ duty, goalC, coldestC }: HeatDayDrawing, printer: Printer): string {
  const room = `room at ${printer.temperature(coldestC)}`
  if (duty === null) return ''
  if (duty > 1) return `too weak with the ${room}`
  return duty === 0
    ? `at ${printer.temperature(goalC)} without heating, ${room}`
    : `held at ${printer.temperature(goalC)}, ${room}: it runs ${printer.measure(duty, 'fraction')} of the time`
}

export const printOff = ({ coldestC }: HeatDayDrawing, printer: Printer): string =>
  `no heater, room at ${printer.temperature(coldestC)}`

export const printStuck = ({ warmestC }: HeatDayDrawing, printer: Printer): string =>
  `stuck on, room at ${printer.temperature(warmestC)}`

/** The text alternative of a day of water. */
export function describeHeatDay(drawing: HeatDayDrawing, printer: Printer): string {
  const { held, off, stuck, goalC } = drawing
  const end = (points: HeatDayDrawing['off']) => printer.temperature(points.at(-1)?.waterC ?? goalC)
  return [
    `The water over 24 hours, starting at ${printer.temperature(goalC)}.`,
    held && `With the heater working: ${printHeld(drawing, printer)}; ${end(held)} after a day.`,
    `With ${printOff(drawing, printer)}: ${end(off)} after a day.`,
    stuck && `With the heater ${printStuck(drawing, printer)}: ${end(stuck)} after a day.`,
  ]
    .filter(Boolean)
    .join(' ')
}
