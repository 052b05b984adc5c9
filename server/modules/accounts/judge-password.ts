import { isCommonPassword } from './common-passwords'

export interface PasswordOwner {
  readonly name: string
  readonly email: string
}

const siteName = 'stillfits'
const keyboardRows = ['qwertyuiop', 'asdfghjkl', 'zxcvbnm', '1234567890']

/** The shortest piece that makes the whole text when it is said over and over, cut off anywhere. */
function findUnit(text: string): string {
  for (let length = 1; length < text.length; length += 1) {
    const unit = text.slice(0, length)
    if (unit.repeat(Math.ceil(text.length / length)).startsWith(text)) return unit
  }
  return text
}

/** Such as "abcdefghijklmnop", "98765432109876543", or a walk along the keys. */
function isSequence(text: string): boolean {
  const codes = [...text].map((character) => character.codePointAt(0) ?? 0)
  const steps = codes.slice(1).map((code, index) => code - (codes[index] ?? 0))
  if ([1, -1].every((step) => !steps.every((taken) => taken === step || taken === -9 * step))) {
    const keys = keyboardRows.join('')
    return keys.includes(text) || [...keys].reverse().join('').includes(text)
  }
  return true
}

/** What is left when digits and signs around it are taken off: "password" of "password!2024!!". */
const stripPadding = (text: string): string => text.replace(/^[^\p{L}]+|[^\p{L}]+$/gu, '')

const squeeze = (text: string): string => text.toLowerCase().replace(/[^\p{L}\p{N}]/gu, '')

function namesSomebody(password: string, { name, email }: PasswordOwner): boolean {
  const [local = ''] = email.split('@')
  return [name, email, local].map(squeeze).some((part) => part.length >= 4 && squeeze(password).includes(part))
}

/** What makes a long enough password easy to guess all the same; null: nothing. */
export async function judgePassword(password: string, owner: PasswordOwner): Promise<string | null> {
  const text = password.normalize('NFC').toLowerCase()
  const unit = findUnit(text)
  if (unit.length === 1) return 'is one character over and over'
  if (isSequence(text)) return 'is a row of characters that follow each other'
  for (const core of [text, unit, stripPadding(text), findUnit(stripPadding(text))]) {
    if (await isCommonPassword(core)) return 'is built on one of the commonest passwords, which are tried first'
  }
  if (unit.length < 8) return 'is one short piece over and over'
  if (squeeze(text).includes(siteName)) return `has the name of this site in it, which is tried first`
  if (namesSomebody(text, owner)) return 'has your name or e-mail address in it, which is tried first'
  return null
}
