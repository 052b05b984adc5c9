import type { StandDrawing } from '#shared/engine/drawings/stand'
import type { Printer } from '#shared/units/print'

const saySpare = (mm: number, printer: Printer) =>
  mm < 0 ? `stands ${printer.length(-mm)} over` : `has ${printer.length(mm)} to spare`

/** What both views show, said under them. */
export function summariseStand({ spareMm, isTurned, standHeightMm, assumed }: StandDrawing, printer: Printer): string {
  return [
    `In the middle of the top the tank ${saySpare(spareMm.length, printer)} along it and ${saySpare(spareMm.width, printer)} from front to back, half at each side.`,
    isTurned && 'It is turned by a quarter: its length runs from front to back.',
    standHeightMm !== null && `The stand is ${printer.length(standHeightMm)} high.`,
    Object.values(assumed).some(Boolean) && 'What is dashed is assumed.',
  ]
    .filter(Boolean)
    .join(' ')
}

/** The text alternative of both views. */
export function describeStand(drawing: StandDrawing, printer: Printer): string {
  const { top, tank, assumed } = drawing
  const mark = (text: string, isAssumed: boolean) => (isAssumed ? `${text} (assumed)` : text)
  const sides = [
    mark(`${printer.length(tank.lengthMm)} along the top`, assumed.length),
    mark(`${printer.length(tank.widthMm)} from front to back`, assumed.width),
    mark(`${printer.length(tank.heightMm)} high`, assumed.height),
  ]
  return `A top of ${printer.size([top.lengthMm, top.widthMm])} and a tank ${sides.join(', ')}. ${summariseStand(drawing, printer)}`
}
