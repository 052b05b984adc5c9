import request from 'supertest'
import { demoPeople } from '../../seeds/people'
import type { Role } from '../../server/db/schema/people'

/** Headers that a page of the site sends for whoever is signed in: for `fetch`, or for supertest's `.set()`. */
export interface SignedInHeaders extends Record<string, string> {
  readonly Cookie: string
  readonly 'Sec-Fetch-Site': string
}

export interface Credentials {
  readonly email: string
  readonly password: string
}

/** Signs in with an e-mail address and a password. */
export async function signInAs(
  app: { readonly url: string },
  { email, password }: Credentials,
): Promise<SignedInHeaders> {
  const response = await request(app.url).post('/api/v1/session').send({ email, password }).expect(200)
  const cookies = (response.headers['set-cookie'] as unknown as string[] | undefined) ?? []
  const cookie = cookies.find((line) => line.includes('session=')) ?? ''
  return { Cookie: cookie.split(';', 1)[0] ?? '', 'Sec-Fetch-Site': 'same-origin' }
}

export function findDemoPerson(role: Role): (typeof demoPeople)[number] {
  const person = demoPeople.find((demo) => demo.role === role)
  if (person === undefined) throw new Error(`There is no demo ${role}`)
  return person
}

/** Signs in as the demo person of a role; the test database holds all three. */
export const signIn = (app: { readonly url: string }, role: Role): Promise<SignedInHeaders> =>
  signInAs(app, findDemoPerson(role))
