import { hash, parseOptions, verify } from '@node-rs/argon2'

/** OWASP's floor for argon2id, which the library takes when no algorithm is named. */
const costs = { memoryCost: 19_456, timeCost: 2, parallelism: 1 }

export const hashPassword = (password: string): Promise<string> => hash(password.normalize('NFC'), costs)

export const isPasswordRight = (passwordHash: string, password: string): Promise<boolean> =>
  verify(passwordHash, password.normalize('NFC'))

/** Whether a hash is cheaper to try than those made today. */
export function isHashWeak(passwordHash: string): boolean {
  const { memoryCost, timeCost } = parseOptions(passwordHash)
  return !passwordHash.startsWith('$argon2id$') || memoryCost < costs.memoryCost || timeCost < costs.timeCost
}

let decoy: Promise<string> | null = null

/** Takes as long as a real check, so that the time tells nobody which e-mail addresses have an account. */
export async function pretendToCheck(password: string): Promise<void> {
  decoy ??= hashPassword('nobody has this password, and nobody ever will')
  await isPasswordRight(await decoy, password)
}
