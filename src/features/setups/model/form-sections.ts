import type { SetupField } from '#shared/kinds/setup-fields'
import { listFields, listSection } from '../../../components/setup/field-groups'

/** Fields of one part of the form: those that most people know, and those that most leave open. */
export interface FormPart {
  readonly title: string
  readonly fields: readonly SetupField[]
  readonly more: readonly SetupField[]
}

const split = (title: string, fields: readonly SetupField[], first: readonly string[]): FormPart => ({
  title,
  fields: fields.filter(({ attribute }) => first.includes(attribute.key)),
  more: fields.filter(({ attribute }) => !first.includes(attribute.key)),
})

const size = ['volumeL', 'outerLengthMm', 'outerWidthMm', 'outerHeightMm', 'waterLineMm', 'filtration']
const build = ['wallMm', 'bottomMm', 'material', 'rim', 'lid', 'shape', 'displayLengthMm', 'displayWidthMm']
const sump = ['lengthMm', 'widthMm', 'waterDepthMm', 'heightMm'].map((key) => `tank.sump.${key}`)
const chamber = ['lengthMm', 'widthMm', 'waterDepthMm', 'heightMm', 'openingLengthMm', 'openingWidthMm']

export const sizePart: FormPart = {
  title: 'Size',
  fields: listFields(size.map((key) => `tank.${key}`)),
  more: listFields(build.map((key) => `tank.${key}`)),
}

export const chamberPart = (at: number): FormPart =>
  split(
    `Chamber ${at + 1}${at === 0 ? ', first from the left' : ''}`,
    listFields(chamber.map((key) => `tank.chambers.${at}.${key}`)),
    ['lengthMm', 'widthMm', 'waterDepthMm'],
  )

export const sumpPart: FormPart = { title: 'Sump', fields: listFields(sump), more: [] }

/** Room, outlets, tap and goals. */
export const aroundParts: readonly FormPart[] = [
  split('Room', listSection('room'), ['coldestC', 'warmestC']),
  split(
    'Outlets',
    [...listFields(['country']), ...listSection('mains')],
    ['country', 'outlets', 'residualCurrentProtected'],
  ),
  split('What it stands on', listSection('support'), []),
  split('Tap water', listSection('water'), ['feedKPa']),
  split('Goals', listSection('goals'), ['temperatureC', 'coral', 'sandDepthMm', 'rockKg']),
]
