import type { PumpCurveDrawing, PumpDrawing } from '#shared/engine/drawings/pump'
import type { Printer } from '#shared/units/print'

/** Less than this between two levels of water is not worth a word. */
const leastLiftMm = 0.5

export const isAtWork = (drawing: PumpCurveDrawing | PumpDrawing): drawing is PumpDrawing => 'system' in drawing

export function printPoint({ flowLph, headM }: PumpDrawing['point'], printer: Printer): string {
  return flowLph > 0
    ? `${printer.flow(flowLph)} against ${printer.measure(headM, 'm')} of head`
    : 'nothing: it does not lift the water'
}

export function printWanted({ turnoversPerHour, lph }: NonNullable<PumpDrawing['wanted']>, printer: Printer): string {
  const [low, high] = turnoversPerHour.map((value) => printer.number(value, '/h'))
  return `wanted: ${printer.pair(lph, 'L/h')}, the water ${low} to ${high} times an hour`
}

export function printPlumbing({ staticHeadM, boreMm, isPipeGiven }: PumpDrawing, printer: Printer): string {
  const pipe = `${isPipeGiven ? 'the' : 'a usual'} pipe, ${printer.length(boreMm)} wide`
  const liftMm = staticHeadM * 1000
  return liftMm < leastLiftMm
    ? `what ${pipe}, takes without lift`
    : `what ${printer.length(liftMm)} of lift and ${pipe}, take`
}

/** The text alternative of a pump's curve, alone or at work. */
export function describePump(drawing: PumpCurveDrawing | PumpDrawing, printer: Printer): string {
  const recorded = drawing.recorded.map(
    ({ headM, flowLph }) => `${printer.flow(flowLph)} at ${printer.measure(headM, 'm')}`,
  )
  const curve = `Flow against head as recorded: ${recorded.join(', ')}.`
  if (!isAtWork(drawing)) return curve
  const { point, slowest, wanted } = drawing
  return [
    curve,
    `It meets ${printPlumbing(drawing, printer)}, at ${printPoint(point, printer)}${wanted ? `; ${printWanted(wanted, printer)}` : ''}.`,
    slowest &&
      `At ${printer.measure(slowest.speedShare, 'fraction')} speed it gives ${printPoint(slowest.point, printer)}.`,
  ]
    .filter(Boolean)
    .join(' ')
}
