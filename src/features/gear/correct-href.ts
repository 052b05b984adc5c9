import type { Attribute } from '#shared/kinds/types'
import { paths } from '../../config/paths'

/** The form that corrects a piece, at the field of one value. */
export const correctHref = (slug: string, { key, type }: Attribute): string =>
  `${paths.gearEdit(slug)}#specs-${key}-${type === 'group' ? 'entries' : 'text'}`
