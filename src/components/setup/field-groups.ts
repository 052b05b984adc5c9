import type { KindKey } from '#shared/kinds/index'
import { findSetupField, setupFields, type SetupField } from '#shared/kinds/setup-fields'

export interface FieldGroup {
  readonly title: string
  readonly fields: readonly SetupField[]
}

export const listFields = (paths: readonly string[]): SetupField[] =>
  paths.flatMap((path) => {
    const field = findSetupField(path)
    return field ? [{ ...field, path }] : []
  })

export const listSection = (section: string): SetupField[] =>
  setupFields.filter(({ path }) => path.startsWith(`${section}.`) && !path.includes('*'))

const size = ['volumeL', 'outerLengthMm', 'outerWidthMm', 'outerHeightMm', 'waterLineMm', 'wallMm', 'bottomMm']
const build = ['material', 'rim', 'lid', 'shape', 'filtration', 'displayLengthMm', 'displayWidthMm']
const chamber = ['lengthMm', 'widthMm', 'waterDepthMm', 'heightMm', 'openingLengthMm', 'openingWidthMm']

const chamberTitle = (at: number, count: number): string =>
  count <= 1 ? 'Rear chamber, if there is one' : `Rear chamber ${at + 1}, from the left`

const sections: Readonly<Record<string, string>> = {
  room: 'Room',
  mains: 'Mains',
  goals: 'Goals',
  water: 'Tap water',
  support: 'What it stands on',
}

const waterKinds: readonly KindKey[] = ['ro-unit', 'booster-pump', 'auto-top-off', 'salt-mix']
const supportKinds: readonly KindKey[] = ['tank', 'stand']

/** Every field of the setup that a kind's answers can rest on, as a form groups them. */
export function listFieldGroups(kind: KindKey, chambers: number): readonly FieldGroup[] {
  const wanted = [
    'room',
    'mains',
    'goals',
    ...(waterKinds.includes(kind) ? ['water'] : []),
    ...(supportKinds.includes(kind) ? ['support'] : []),
  ]
  const count = Math.max(1, chambers)
  return [
    { title: 'Tank size', fields: listFields(size.map((key) => `tank.${key}`)) },
    ...Array.from({ length: count }, (_, at) => ({
      title: chamberTitle(at, count),
      fields: listFields(chamber.map((key) => `tank.chambers.${at}.${key}`)),
    })),
    { title: 'How the tank is built', fields: listFields(build.map((key) => `tank.${key}`)) },
    ...wanted.map((section) => ({
      title: sections[section] ?? section,
      fields: [...(section === 'mains' ? listFields(['country']) : []), ...listSection(section)],
    })),
  ]
}

/** The id of a field's control, for labels, errors and links into the form. */
export const fieldId = (path: string): string => `field-${path.replaceAll('.', '-')}`
