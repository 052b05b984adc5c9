import type { Request, RequestHandler, Response } from 'express'
import { isAdmin, type Actor } from '../lib/actor'
import { AppError } from '../lib/errors'

/** Who a session's id stands for; `publicId` is what a person's own list calls the session by. */
export type FindSession = (id: string) => Promise<{ readonly actor: Actor; readonly publicId: string } | null>

/** Browsers keep a name with this prefix to HTTPS, this very host and the whole site; over plain HTTP they refuse it. */
export const nameSessionCookie = (isHttps: boolean): string => (isHttps ? '__Host-session' : 'session')

const nameDeviceCookie = (isHttps: boolean): string => (isHttps ? '__Host-device' : 'device')

function readCookie(req: Request, name: string): string | null {
  for (const part of (req.headers.cookie ?? '').split(';')) {
    const [key, value] = part.trim().split('=', 2)
    if (key === name && value !== undefined && value !== '') return value
  }
  return null
}

export const readSessionId = (req: Request, isHttps: boolean): string | null =>
  readCookie(req, nameSessionCookie(isHttps))

/** What this browser was given when somebody signed in with it. */
export const readDevice = (req: Request, isHttps: boolean): string | null => readCookie(req, nameDeviceCookie(isHttps))

const shield = (isHttps: boolean) => ({ httpOnly: true, sameSite: 'lax', secure: isHttps, path: '/' }) as const

/** The server ends a session; the cookie merely lives long enough for the longest. */
export function sendSessionCookie(res: Response, isHttps: boolean, id: string, maxAge: number): void {
  res.cookie(nameSessionCookie(isHttps), id, { ...shield(isHttps), maxAge })
}

const yearMs = 365 * 24 * 60 * 60 * 1000

export function sendDeviceCookie(res: Response, isHttps: boolean, device: string): void {
  res.cookie(nameDeviceCookie(isHttps), device, { ...shield(isHttps), maxAge: yearMs })
}

export function clearSessionCookie(res: Response, isHttps: boolean): void {
  res.clearCookie(nameSessionCookie(isHttps), shield(isHttps))
}

/** Looks up who is signed in, on each request anew: a lost role or a suspension counts from the next one on. */
export function createSessionLookup(findSession: FindSession, isHttps: boolean): RequestHandler {
  return async (req, res, next) => {
    const id = readSessionId(req, isHttps)
    const found = id === null ? null : await findSession(id)
    res.locals.actor = found?.actor ?? null
    res.locals.sessionPublicId = found?.publicId ?? null
    next()
  }
}

/** Who is signed in, as the session's middleware found it; null for a visitor. */
export function getActor(res: Response): Actor | null {
  return (res.locals.actor as Actor | null | undefined) ?? null
}

export function requireActor(res: Response): Actor {
  const actor = getActor(res)
  if (actor === null) throw new AppError('unauthenticated', 'Sign in to do this.')
  return actor
}

/** Before the body is read: whoever may not come in is told nothing about it. */
export function requireAdmin(res: Response): Actor {
  const actor = requireActor(res)
  if (!isAdmin(actor)) throw new AppError('forbidden', 'Only admins come in here.')
  return actor
}

/** What the list of a person's sessions calls this one. */
export function getSessionPublicId(res: Response): string {
  const publicId = res.locals.sessionPublicId as string | null | undefined
  if (typeof publicId !== 'string') throw new AppError('unauthenticated', 'Sign in to do this.')
  return publicId
}
