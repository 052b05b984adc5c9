import { tankGoals } from './fill-displaced'
import { fillHeat, fillLight, fillPower, fillPump, fillRod } from './fill-gear'
import { fillMembrane, fillSalt, fillSand, fillSeawater, fillWeight } from './fill-supplies'
import type { Filled, FilledValue, FillInput, Subject } from './fill-types'
import { createScene } from '../scene'
import { resolve } from '../setup/resolve'
import type { Item, Setup } from '../types'
import type { SetupSection, Worksheet } from './types'

const fillers: Readonly<Record<string, (input: FillInput) => Filled>> = {
  'heat-balance': (input) => ({ ...fillHeat(input), ...tankGoals(input.scene.plan) }),
  'rod-in-chamber': fillRod,
  'light-map': fillLight,
  'pump-point': fillPump,
  'filled-weight': fillWeight,
  'power-load': fillPower,
  membrane: fillMembrane,
  'sand-bed': fillSand,
  'salt-mix': fillSalt,
  seawater: fillSeawater,
}

/** The kind of piece that a worksheet is about, where there is one. */
const subjectKinds: Readonly<Record<string, string>> = {
  'rod-in-chamber': 'heater',
  'light-map': 'light',
  'pump-point': 'return-pump',
  membrane: 'ro-unit',
  'sand-bed': 'sand',
  'salt-mix': 'salt-mix',
}

/** Every leaf of a value by its dotted path. */
function flatten(path: string, value: unknown): [string, FilledValue][] {
  if (value === null || value === undefined) return []
  if (Array.isArray(value)) {
    if (value.every((one) => typeof one !== 'object')) return [[path, value as readonly string[]]]
    return value.flatMap((one, at) => flatten(`${path}.${at}`, one))
  }
  if (typeof value === 'object') return Object.entries(value).flatMap(([key, one]) => flatten(`${path}.${key}`, one))
  return [[path, value as FilledValue]]
}

function flattenSection(setup: Setup, section: SetupSection): [string, FilledValue][] {
  if (section === 'room') return flatten('room', setup.room)
  if (section === 'goals') {
    // No worksheet asks how often the water is to be turned over.
    const { turnoverPerHour: _, ...goals } = setup.goals ?? {}
    return flatten('goals', goals)
  }
  const { specs, volumeL } = setup.tank
  const said = Object.entries(specs).flatMap(([key, entry]) => flatten(`tank.${key}`, entry?.value))
  return volumeL === undefined ? said : [['tank.volumeL', volumeL], ...said]
}

const toItem = ({ piece, quantity, place, mountHeightMm }: Subject): Item => ({
  id: 'subject',
  piece,
  quantity,
  state: 'planned',
  ...(place && { place }),
  ...(mountHeightMm !== undefined && { mountHeightMm }),
})

/**
 * A worksheet's inputs as a setup tells them, with a piece in place of the setup's own of its kind where one is given.
 * RangeError where the tank has neither size nor volume.
 */
export function fillWorksheet({ name, setup: parts }: Worksheet, setup: Setup, given?: Subject): Filled {
  const counted = setup.items.filter(({ state }) => state !== 'gone')
  const subject = given ?? counted.find(({ piece }) => piece.kind === subjectKinds[name])
  const isInPlace = subject !== undefined && !('isBeside' in subject)
  const others = isInPlace ? counted.filter(({ piece }) => piece.kind !== subject.piece.kind) : counted
  const items = subject ? [...others, toItem(subject)] : counted
  const scene = createScene(resolve({ ...setup, items: others }), others)
  const own = fillers[name]?.({ scene, items, subject }) ?? {}
  return { ...Object.fromEntries((parts?.sections ?? []).flatMap((section) => flattenSection(setup, section))), ...own }
}
