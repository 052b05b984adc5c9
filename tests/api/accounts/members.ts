import request from 'supertest'
import type { TestApp } from '../../support/app'
import { findToken } from '../../support/letters'
import { signInAs, type Credentials, type SignedInHeaders } from '../../support/sign-in'

let made = 0

export interface Member extends Credentials {
  readonly name: string
}

export const goodPassword = 'limpets hold on by themselves'

/** An invented person who has not signed up yet. */
export function inventMember(): Member {
  made += 1
  return { name: `Ledge ${made}`, email: `ledge${made}@example.com`, password: goodPassword }
}

export const send = (app: TestApp, path: string, body: object, headers: Record<string, string> = {}) =>
  request(app.url).post(`/api/v1${path}`).set(headers).send(body)

/** Signs somebody up and opens the link in the letter, as a person would. */
export async function addMember(app: TestApp, member = inventMember()): Promise<Member> {
  const { name, email, password } = member
  await send(app, '/people', { name, email, password }).expect(202)
  await send(app, '/people/confirm', { token: await findToken(app.client.pool, email) }).expect(200)
  return member
}

export async function addSignedIn(app: TestApp): Promise<{ member: Member; headers: SignedInHeaders }> {
  const member = await addMember(app)
  return { member, headers: await signInAs(app, member) }
}
