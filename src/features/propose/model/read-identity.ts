import { limits } from '#shared/limits'
import { gtinSchema } from '#shared/schemas/gtin'
import type { ProposalRequest } from '#shared/schemas/proposals'
import type { Problem } from './read-spec'
import { textToNotes } from './notes-text'
import type { FormBase, TypedForm } from './typed-form'

type Identity = NonNullable<ProposalRequest['identity']>

const longest = { brand: limits.brand, model: limits.model } as const

const isStatus = (text: string): text is NonNullable<Identity['status']> =>
  ['current', 'discontinued', 'unknown'].includes(text)

function readName(key: 'brand' | 'model', typed: string, isNew: boolean): readonly Problem[] {
  const path = `identity.${key}`
  const what = key === 'brand' ? 'the brand that is printed on it' : 'the model as its maker writes it'
  if (typed === '' && isNew) return [{ path, message: `Say ${what}.` }]
  if (typed === '') return [{ path, message: `A piece cannot be without it: say ${what}.` }]
  if (typed.length > longest[key]) return [{ path, message: `Keep it to ${longest[key]} characters.` }]
  return []
}

/** What names the piece, where it differs from the record; all of it for a new piece. */
export function readIdentity({ gear, typed: initial }: FormBase, { identity }: TypedForm) {
  const problems: Problem[] = []
  const value: { -readonly [Key in keyof Identity]: Identity[Key] } = {}
  for (const key of ['brand', 'model'] as const) {
    const text = identity[key].trim()
    problems.push(...readName(key, text, gear === null))
    if (text !== '' && text !== gear?.[key]) value[key] = text
  }
  if (isStatus(identity.status) && identity.status !== gear?.status) value.status = identity.status
  const gtin = identity.gtin.replaceAll(/[\s-]/g, '')
  if (gtin !== (gear?.gtin ?? '')) {
    const read = gtinSchema.safeParse(gtin)
    if (gtin === '') value.gtin = null
    else if (read.success) value.gtin = read.data
    else
      problems.push({
        path: 'identity.gtin',
        message: `The barcode number ${read.error.issues[0]?.message ?? 'is none'}.`,
      })
  }
  if (identity.notes.trim() !== initial.identity.notes.trim()) value.notes = textToNotes(identity.notes)
  return { value, problems }
}
