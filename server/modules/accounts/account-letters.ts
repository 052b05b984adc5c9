import { composeLetter } from '../mail/templates/compose-letter'
import type { LetterContent } from '../mail/templates/letter-content'

type Recipient = { readonly personId: number | null; readonly recipient: string }

const create = (kind: string, to: Recipient, content: LetterContent) => ({
  ...to,
  kind: `account.${kind}`,
  ...composeLetter(content),
})

const notYou = 'If that was not you, ask for a new password on the sign-in page at once.'

export const writeConfirmLetter = (to: Recipient, name: string, url: string) =>
  create('confirm', to, {
    subject: 'Confirm your address for Stillfits',
    paragraphs: [
      `Somebody signed up with this address, under the name ${name}. If that was you, open the link within two days.`,
      'If not, leave this letter be: without the link nothing happens.',
    ],
    action: { label: 'Confirm your address', url },
  })

export const writeKnownLetter = (to: Recipient, name: string, origin: string) =>
  create('known', to, {
    subject: 'You have an account with Stillfits already',
    paragraphs: [
      `Somebody wanted to sign up, or to change to this address, which has an account already: ${name}.`,
      'If that was you, sign in with it, or ask for a new password there. If not, you need do nothing.',
    ],
    action: { label: 'Sign in', url: `${origin}/sign-in` },
  })

export const writeResetLetter = (to: Recipient, name: string, url: string) =>
  create('reset', to, {
    subject: 'Choose a new password for Stillfits',
    paragraphs: [
      `Somebody asked for a new password for the account of ${name}. If that was you, open the link within an hour.`,
      'If not, leave this letter be: your password stays as it is.',
    ],
    action: { label: 'Choose a new password', url },
  })

export const writePasswordChangedLetter = (to: Recipient, name: string, origin: string) =>
  create('password-changed', to, {
    subject: 'Your password for Stillfits was changed',
    paragraphs: [`The password of the account of ${name} was just changed. ${notYou}`],
    action: { label: 'Sign in', url: `${origin}/sign-in` },
  })

export const writeEmailChangeLetter = (to: Recipient, name: string, url: string) =>
  create('email-change', to, {
    subject: 'Confirm your new address for Stillfits',
    paragraphs: [
      `${name} wants to be reached at this address from now on. If that was you, open the link within two days.`,
      'If not, leave this letter be: without the link nothing happens.',
    ],
    action: { label: 'Confirm your new address', url },
  })

export const writeEmailChangeNotice = (to: Recipient, name: string, origin: string) =>
  create('email-change-notice', to, {
    subject: 'Your address for Stillfits is being changed',
    paragraphs: [
      `Somebody who knows the password of ${name} asked to use another e-mail address. It counts once it is confirmed there.`,
      notYou,
    ],
    action: { label: 'Sign in', url: `${origin}/sign-in` },
  })

export const writeGoodbyeLetter = (recipient: string) =>
  create(
    'deleted',
    { personId: null, recipient },
    {
      subject: 'Your account with Stillfits is deleted',
      paragraphs: [
        'Your name, your address and your password are gone from our records, and every session has ended.',
        'What you contributed to the shared record stays, without your name. This is the last letter from us.',
      ],
    },
  )
