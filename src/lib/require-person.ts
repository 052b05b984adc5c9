import type { SignedIn } from '#shared/schemas/accounts'
import type { App } from './app-context'
import { requireData, throwFailure } from './loading'
import { ApiError } from './problem'
import { sessionQuery } from './session'

/** For a page that is somebody's own, or a role's: visitors are asked to sign in, others told that it is not for them. */
export async function requirePerson(app: App, right: keyof SignedIn['can'], refusal: string): Promise<void> {
  const { person } = await requireData(app, sessionQuery(app.api))
  if (person === null) throwFailure(new ApiError(401, 'Sign in', 'Sign in to do this.'))
  else if (!person.can[right]) throwFailure(new ApiError(403, 'Not open to you', refusal))
}
