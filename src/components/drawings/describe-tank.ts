import type { Printer } from '#shared/units/print'
import { activeChamber, type RodDrawing, type TankDrawing } from './tank-drawing'

const words = { upright: 'stands upright', leaning: 'leans', flat: 'lies flat' } as const

/** Vertical room between an upright rod and the water line; negative where it stands out of the water. */
export function uprightSlackMm(rod: RodDrawing, waterDepthMm: number): number {
  return waterDepthMm - rod.lengthMm
}

export function describeSlack(slackMm: number, printer: Printer): string {
  return slackMm < 0 ? `${printer.length(-slackMm)} too long` : `${printer.length(slackMm)} to spare`
}

export function describeRod(rod: RodDrawing, where: string, waterDepthMm: number, printer: Printer): string {
  const angle = rod.position === 'leaning' ? ` at ${printer.measure(rod.angleDeg, 'deg')}` : ''
  const slack =
    rod.position === 'upright'
      ? `, ${describeSlack(uprightSlackMm(rod, waterDepthMm), printer)} under the water line`
      : ''
  return `A rod ${printer.length(rod.lengthMm)} long and ${printer.length(rod.diameterMm)} thick ${words[rod.position]}${angle} in ${where}${slack}.`
}

/** The text alternative of plan and section: every number drawn, and which are assumed. */
export function describeTank(drawing: TankDrawing, printer: Printer): string {
  const { given, chambers, rod } = drawing
  const mark = (text: string, path: string) => (given.has(path) ? text : `${text} (assumed)`)
  const sentences = [
    `Outside ${mark(`${printer.length(drawing.outerLengthMm)} long`, 'tank.outerLengthMm')}, ` +
      `${mark(`${printer.length(drawing.outerWidthMm)} from front to back`, 'tank.outerWidthMm')}, ` +
      `${mark(`${printer.length(drawing.outerHeightMm)} high`, 'tank.outerHeightMm')}.`,
    `Water line ${mark(printer.length(drawing.waterLineMm), 'tank.waterLineMm')} above the floor inside, ` +
      `walls ${mark(printer.length(drawing.wallMm), 'tank.wallMm')}.`,
    ...chambers.map(
      (chamber, at) =>
        `${chamber.name}, ${at === 0 ? 'first from the left along the back wall' : 'to its right'}: ` +
        `${mark(`${printer.length(chamber.lengthMm)} along the tank`, `tank.chambers.${at}.lengthMm`)}, ` +
        `${mark(`${printer.length(chamber.widthMm)} from front to back`, `tank.chambers.${at}.widthMm`)}, ` +
        `water ${mark(`${printer.length(chamber.waterDepthMm)} deep`, `tank.chambers.${at}.waterDepthMm`)}.`,
    ),
  ]
  if (rod) {
    const chamber = chambers[activeChamber(drawing)]
    sentences.push(
      describeRod(rod, chamber?.name ?? 'the display', chamber?.waterDepthMm ?? drawing.waterLineMm, printer),
    )
  }
  return sentences.join(' ')
}
