import { createHmac, randomBytes, timingSafeEqual } from 'node:crypto'

function sign(mark: string, passwordHash: string): Buffer {
  return createHmac('sha256', passwordHash).update(`device ${mark}`).digest()
}

/**
 * What a browser keeps in which somebody has signed in: while strangers try an account's password, its owner can still
 * sign in there. It signs nobody in by itself, and counts for nothing once the password is another.
 */
export function createDeviceMark(passwordHash: string): string {
  const mark = randomBytes(16).toString('base64url')
  return `${mark}.${sign(mark, passwordHash).toString('base64url')}`
}

export function isKnownDevice(device: string | null, passwordHash: string): boolean {
  const [mark, signature, ...rest] = (device ?? '').split('.')
  if (mark === undefined || signature === undefined || rest.length > 0) return false
  const given = Buffer.from(signature, 'base64url')
  const right = sign(mark, passwordHash)
  return given.length === right.length && timingSafeEqual(given, right)
}
