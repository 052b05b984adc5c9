import autocannon from 'autocannon'
import { Trouble } from '../lib/say.mjs'
import { summarise } from './figures.mjs'

/**
 * @typedef {{ perSecond: number, ms: import('./figures.mjs').Figures, requests: number }} Load
 * @typedef {{ method: string, path: string, body?: string }} Request
 */

/** Enough for the code to be compiled that the requests run through. */
const warmUpRequests = 300

/** A visitor's address per request: limits on one address are not what is measured. */
function addressOf(/** @type {number} */ index) {
  return `10.${(index >> 16) & 255}.${(index >> 8) & 255}.${index & 255}`
}

/** @returns {Promise<{ times: number[], seconds: number }>} */
function shoot(
  /** @type {string} */ origin,
  /** @type {(index: number) => Request} */ describe,
  /** @type {{ seconds: number, connections: number, from: number, amount?: number }} */ options,
) {
  return new Promise((resolve, reject) => {
    let index = options.from
    /** @type {number[]} */
    const times = []
    /** @type {import('autocannon').SetupRequest} */
    const setupRequest = (request) => {
      index += 1
      const { body, ...line } = describe(index)
      const type = body === undefined ? {} : { 'content-type': 'application/json' }
      const headers = { 'x-forwarded-for': addressOf(index), accept: 'application/json', ...type }
      return { ...request, ...line, headers, ...(body !== undefined && { body }) }
    }
    const { seconds, from: _, ...rest } = options
    const run = autocannon(
      { url: origin, duration: seconds, timeout: 60, requests: [{ setupRequest }], ...rest },
      (error, result) => {
        if (error) return reject(error)
        if (result.non2xx > 0 || result.errors > 0)
          return reject(
            new Trouble(`${origin} answered ${result.non2xx} requests wrongly, ${result.errors} not at all.`),
          )
        if (times.length === 0) return reject(new Trouble(`${origin} answered nothing within ${options.seconds} s.`))
        resolve({ times, seconds: result.duration })
      },
    )
    run.on('response', (_client, _status, _bytes, ms) => times.push(ms))
  })
}

/** @typedef {{ origin: string, describe: (index: number) => Request, connections: number }} Target */

const rounds = 4

/**
 * Requests to each target on so many connections, each as soon as the one before is answered. First a warm-up; then the
 * targets take turns, one at a time, so that whatever else the machine does falls on all of them alike.
 * @param {readonly Target[]} targets
 * @param {number} seconds for each of them in all
 * @returns {Promise<Load[]>}
 */
export async function loadInTurns(targets, seconds) {
  const shots = targets.map((target) => ({ ...target, times: /** @type {number[]} */ ([]), seconds: 0 }))
  for (const { origin, describe, connections } of shots)
    await shoot(origin, describe, { seconds, connections, from: 1 << 20, amount: warmUpRequests })
  for (let round = 0; round < rounds; round += 1)
    for (const shot of shots) {
      const { origin, describe, connections } = shot
      const from = (round + 1) << 16
      const { times, seconds: took } = await shoot(origin, describe, { seconds: seconds / rounds, connections, from })
      for (const ms of times) shot.times.push(ms)
      shot.seconds += took
    }
  return shots.map(({ times, seconds: took }) => ({
    perSecond: times.length / took,
    ms: summarise(times),
    requests: times.length,
  }))
}
