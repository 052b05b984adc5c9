import { readGroup, readGroups, readNumber, readText } from '../values'
import type { ChamberInput, Specs, TankInput } from '../types'
import type { Chamber, IncludedPump, TankPlan, WaterTub } from './plan'

type Writable<T> = { -readonly [K in keyof T]: T[K] }

type Assume = <T extends number | string>(key: string, value: T) => T

interface Size {
  readonly outerLengthMm: number
  readonly outerWidthMm: number
  readonly outerHeightMm: number
  readonly waterLineMm: number
  readonly wallMm: number
}

const lineShareOfHeight = 0.92
const lengthPerWidth = 1.5
const linePerWidth = 0.9

/** Glass grows with height: common practice for frameless panes, not a structural rule. */
const chooseWallMm = (outerHeightMm: number): number =>
  outerHeightMm <= 350 ? 6 : outerHeightMm <= 450 ? 8 : outerHeightMm <= 550 ? 10 : 12

/**
 * Inside length, width and water line (mm) of a tank of which only the volume (L) and perhaps a size or two are known:
 * length 1.5 × width and water line 0.9 × width, stretched where the chambers that were given need more; no shorter than
 * half its width, however wide that is said to be.
 */
function guessInside(
  volumeL: number,
  known: { lengthMm: number | undefined; widthMm: number | undefined; lineMm: number | undefined },
  chambers: readonly ChamberInput[],
) {
  const volume = volumeL * 1e6
  const deepest = Math.max(0, ...chambers.map((chamber) => chamber.waterDepthMm ?? 0))
  const { lengthMm, widthMm, lineMm } = known
  const cubeWidth = Math.cbrt(volume / (lengthPerWidth * linePerWidth))
  let line = lineMm
  if (line === undefined) {
    if (lengthMm && widthMm) line = volume / (lengthMm * widthMm)
    else if (lengthMm) line = Math.max(linePerWidth * Math.sqrt(volume / (lengthMm * linePerWidth)), deepest)
    else if (widthMm) line = Math.max(Math.min(linePerWidth * widthMm, (2 * volume) / widthMm ** 2), deepest)
    else line = Math.max(linePerWidth * cubeWidth, deepest)
  }
  const floor = volume / line
  const width = widthMm ?? (lengthMm ? floor / lengthMm : Math.sqrt(floor / lengthPerWidth))
  const length = lengthMm ?? floor / width
  const needed = chambers.reduce((sum, chamber) => sum + (chamber.lengthMm ?? 0), 0)
  if (lengthMm === undefined && widthMm === undefined && needed > length)
    return { length: needed, width: floor / needed, line }
  return { length, width, line }
}

/** Whether a tank can be laid out at all: by its outside size, or by a nominal volume. */
export const hasSize = (specs: Specs): boolean =>
  readNumber(specs, 'nominalVolumeL') !== undefined ||
  ['outerLengthMm', 'outerWidthMm', 'outerHeightMm'].every((key) => readNumber(specs, key) !== undefined)

function resolveSize(
  specs: Specs,
  volumeL: number | undefined,
  chambers: readonly ChamberInput[],
  assume: Assume,
): Size {
  const given = (key: string) => readNumber(specs, key)
  const length = given('outerLengthMm')
  const width = given('outerWidthMm')
  const height = given('outerHeightMm')
  if (volumeL === undefined || (length && width && height)) {
    if (!length || !width || !height) throw new RangeError('A setup needs the outside size of its tank, or a volume')
    const wallMm = given('wallMm') ?? assume('tank.wallMm', chooseWallMm(height))
    return {
      outerLengthMm: length,
      outerWidthMm: width,
      outerHeightMm: height,
      wallMm,
      waterLineMm: given('waterLineMm') ?? assume('tank.waterLineMm', lineShareOfHeight * height),
    }
  }
  const lineGiven = given('waterLineMm') ?? (height && lineShareOfHeight * height)
  const wallGiven = given('wallMm')
  const thickness = (outerHeightMm: number) => wallGiven ?? chooseWallMm(outerHeightMm)
  // The walls depend on the height and the height on the inside, so the inside is guessed once with provisional walls.
  const provisional = thickness(height ?? 400)
  const inside = guessInside(
    volumeL,
    {
      lengthMm: length ? length - 2 * provisional : undefined,
      widthMm: width ? width - 2 * provisional : undefined,
      lineMm: lineGiven || undefined,
    },
    chambers,
  )
  const tallest = Math.max(0, ...chambers.map((chamber) => chamber.heightMm ?? 0))
  const bottomMm = given('bottomMm') ?? thickness(tallest + thickness(Infinity))
  const outerHeightMm = height ?? Math.max(inside.line / lineShareOfHeight, tallest > 0 ? tallest + bottomMm : 0)
  const wallMm = thickness(outerHeightMm)
  return {
    outerLengthMm: length ?? assume('tank.outerLengthMm', inside.length + 2 * wallMm),
    outerWidthMm: width ?? assume('tank.outerWidthMm', inside.width + 2 * wallMm),
    outerHeightMm: height ?? assume('tank.outerHeightMm', outerHeightMm),
    wallMm: wallGiven ?? assume('tank.wallMm', wallMm),
    waterLineMm: given('waterLineMm') ?? assume('tank.waterLineMm', inside.line),
  }
}

function resolveChamber(
  input: ChamberInput,
  index: number,
  isAlone: boolean,
  insideHeightMm: number,
  waterLineMm: number,
  assume: Assume,
): Chamber {
  const path = `tank.chambers.${index}`
  const chamber: Writable<Chamber> = {
    id: input.id,
    name: input.name ?? (isAlone ? 'rear chamber' : `chamber “${input.id}”`),
    lengthMm: input.lengthMm ?? assume(`${path}.lengthMm`, 100),
    widthMm: input.widthMm ?? assume(`${path}.widthMm`, 100),
    waterDepthMm:
      input.waterDepthMm ?? assume(`${path}.waterDepthMm`, Math.min(waterLineMm, input.heightMm ?? Infinity)),
    heightMm: input.heightMm ?? assume(`${path}.heightMm`, insideHeightMm),
  }
  if (input.openingLengthMm !== undefined) chamber.openingLengthMm = input.openingLengthMm
  if (input.openingWidthMm !== undefined) chamber.openingWidthMm = input.openingWidthMm
  return chamber
}

/** Litres in a box of water. */
const boxVolumeL = (box: WaterTub): number => (box.insideLengthMm * box.insideWidthMm * box.waterDepthMm) / 1e6

function resolveSump(specs: Specs, size: Size, assume: Assume): WaterTub {
  const sump = readGroup<{ lengthMm?: number; widthMm?: number; waterDepthMm?: number }>(specs, 'sump') ?? {}
  return {
    insideLengthMm: sump.lengthMm ?? assume('tank.sump.lengthMm', 0.6 * size.outerLengthMm),
    insideWidthMm: sump.widthMm ?? assume('tank.sump.widthMm', 0.7 * size.outerWidthMm),
    waterDepthMm: sump.waterDepthMm ?? assume('tank.sump.waterDepthMm', 250),
    wallMm: 6,
    bottomMm: 6,
    material: 'glass',
  }
}

/** The tank with its defaults filled in; `displaced` is the volume (L) of rock and sand, 0 where the person gave none. */
export function resolveTank(
  input: TankInput,
  displaced: (area: { displayLengthMm: number; displayWidthMm: number }) => number,
  assume: Assume,
): TankPlan {
  const { specs } = input
  const chamberInputs = readGroups<ChamberInput>(specs, 'chambers') ?? []
  const nominalL = readNumber(specs, 'nominalVolumeL') ?? input.volumeL
  const size = resolveSize(specs, nominalL, chamberInputs, assume)
  const bottomMm = readNumber(specs, 'bottomMm') ?? assume('tank.bottomMm', size.wallMm)
  const choose = <T extends string>(key: string, fallback: T): T =>
    (readText(specs, key) as T | undefined) ?? assume(`tank.${key}`, fallback)
  const material = choose('material', 'glass')
  const insideLengthMm = size.outerLengthMm - 2 * size.wallMm
  const insideWidthMm = size.outerWidthMm - 2 * size.wallMm
  const insideHeightMm = size.outerHeightMm - bottomMm
  const sumpGiven = readGroup(specs, 'sump') !== undefined
  const filtration = choose<TankPlan['filtration']>(
    'filtration',
    chamberInputs.length > 0 ? 'rear-chambers' : sumpGiven ? 'sump' : 'none',
  )
  const chambers = chamberInputs.map((chamber, index) =>
    resolveChamber(chamber, index, chamberInputs.length === 1, insideHeightMm, size.waterLineMm, assume),
  )
  const widest = Math.max(0, ...chambers.map((chamber) => chamber.widthMm))
  const main: WaterTub = {
    insideLengthMm,
    insideWidthMm,
    waterDepthMm: size.waterLineMm,
    wallMm: size.wallMm,
    bottomMm,
    material,
  }
  const boxes = filtration === 'sump' ? [main, resolveSump(specs, size, assume)] : [main]
  const grossL = boxes.reduce((sum, box) => sum + boxVolumeL(box), 0)
  const displayLengthMm = readNumber(specs, 'displayLengthMm') ?? assume('tank.displayLengthMm', insideLengthMm)
  const displayWidthMm = readNumber(specs, 'displayWidthMm') ?? assume('tank.displayWidthMm', insideWidthMm - widest)
  const includedPump = readGroup<IncludedPump>(specs, 'includedPump')
  const dims = specs['outerLengthMm'] ?? specs['chambers']
  const returnBoreMm = readNumber(specs, 'returnBoreMm')
  const dryMassKg = readNumber(specs, 'dryMassKg')
  // Written out: spreading what may be there takes longer than all the rest, and a search resolves hundreds of tanks.
  const plan: Writable<TankPlan> = {
    outerLengthMm: size.outerLengthMm,
    outerWidthMm: size.outerWidthMm,
    outerHeightMm: size.outerHeightMm,
    waterLineMm: size.waterLineMm,
    wallMm: size.wallMm,
    bottomMm,
    source: dims?.source ?? 'estimate',
    material,
    rim: choose('rim', 'rimless'),
    lid: choose('lid', 'none'),
    shape: choose('shape', 'rectangle'),
    filtration,
    insideLengthMm,
    insideWidthMm,
    insideHeightMm,
    displayLengthMm,
    displayWidthMm,
    chambers,
    boxes,
    grossL,
    ratedL: nominalL ?? grossL,
    waterL: Math.max(0, grossL - displaced({ displayLengthMm, displayWidthMm })),
  }
  if (input.gear) plan.gear = input.gear
  if (dims?.plusMinus !== undefined) plan.plusMinus = dims.plusMinus
  if (includedPump) plan.includedPump = includedPump
  if (returnBoreMm !== undefined) plan.returnBoreMm = returnBoreMm
  if (dryMassKg !== undefined) plan.dryMassKg = dryMassKg
  return plan
}
