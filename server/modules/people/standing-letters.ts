import { composeLetter } from '../mail/templates/compose-letter'
import type { LetterContent } from '../mail/templates/letter-content'

interface Recipient {
  readonly personId: number
  readonly recipient: string
}

const create = (kind: string, to: Recipient, content: LetterContent) => ({ ...to, kind, ...composeLetter(content) })

const duties = {
  member: 'You can go on contributing as before.',
  moderator: 'You can review what others propose, at the review desk.',
  admin: 'You can review what others propose, and look after people and letters.',
} as const

export const writeRoleLetter = (to: Recipient, role: keyof typeof duties, origin: string) =>
  create('account.role', to, {
    subject: `You are ${role === 'admin' ? 'an' : 'a'} ${role} of Stillfits now`,
    paragraphs: [`An admin has changed your role to ${role}. ${duties[role]}`],
    action: { label: 'Open Stillfits', url: origin },
  })

export const writeSuspensionLetter = (to: Recipient, reason: string) =>
  create('account.suspended', to, {
    subject: 'Your account with Stillfits is suspended',
    paragraphs: [
      'An admin has suspended your account, so you cannot sign in for now. What you contributed is kept. The reason:',
    ],
    quote: reason,
  })

export const writeReturnLetter = (to: Recipient, origin: string) =>
  create('account.restored', to, {
    subject: 'Your account with Stillfits is open again',
    paragraphs: ['An admin has lifted the suspension of your account. You can sign in and contribute again.'],
    action: { label: 'Sign in', url: `${origin}/sign-in` },
  })
