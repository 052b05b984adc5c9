import { randomBytes } from 'node:crypto'
import type { RequestHandler, Response } from 'express'
import helmet from 'helmet'

const secondsPerYear = 31_536_000

/** A new nonce for every response: scripts without it do not run. */
export const assignNonce: RequestHandler = (_req, res, next) => {
  res.locals.nonce = randomBytes(16).toString('base64')
  next()
}

export function getNonce(res: Response): string {
  return String(res.locals.nonce)
}

/** `isHttps`: whether visitors reach the site by HTTPS; then browsers are told to insist on it. */
export function createSecurityHeaders(isHttps: boolean): RequestHandler {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'", (_req, res) => `'nonce-${getNonce(res as Response)}'`],
        scriptSrcAttr: ["'none'"],
        styleSrc: ["'self'", (_req, res) => `'nonce-${getNonce(res as Response)}'`],
        // Drawings are placed with style attributes, which server rendering writes into the page.
        styleSrcAttr: ["'unsafe-inline'"],
        imgSrc: ["'self'", 'data:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        formAction: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        frameAncestors: ["'none'"],
        ...(isHttps && { upgradeInsecureRequests: [] }),
      },
    },
    strictTransportSecurity: isHttps ? { maxAge: secondsPerYear, includeSubDomains: true } : false,
    referrerPolicy: { policy: 'strict-origin-when-cross-origin' },
    xFrameOptions: { action: 'deny' },
  })
}
