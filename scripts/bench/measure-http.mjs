import { writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { say, Trouble } from '../lib/say.mjs'
import { loadInTurns } from './load.mjs'
import { askForHeaterAmongItems, askForReplacement, misspell } from './questions.mjs'
import { startBareServer } from './servers.mjs'

/** @typedef {import('./load.mjs').Load} Load */
/** @typedef {import('./load.mjs').Request} Request */
/** @typedef {(index: number) => Request} Describe */

const connections = 8

/** @returns {Promise<string>} */
async function fetchText(/** @type {string} */ origin, /** @type {Request} */ { method, path, body }) {
  const init = body === undefined ? { method } : { method, body, headers: { 'content-type': 'application/json' } }
  const response = await fetch(`${origin}${path}`, init)
  const text = await response.text()
  if (!response.ok) throw new Trouble(`${path} answered ${response.status}: ${text.slice(0, 300)}`)
  return text
}

/**
 * `fit` under load, and a bare route that sends an answer of the same bytes: as bytes that are ready, and as JSON that is
 * yet to be written.
 * @param {{ origin: string, describe: Describe, seconds: number, folder: string,
 *   defer: (stop: () => Promise<void>) => void }} options
 */
export async function measureFit({ origin, describe, seconds, folder, defer }) {
  const answer = await fetchText(origin, describe(1))
  const bodyFile = join(folder, 'answer.json')
  writeFileSync(bodyFile, answer)
  const bare = await startBareServer(bodyFile, defer)
  /** @returns {Describe} */
  const at = (/** @type {string} */ path) => (index) => ({ ...describe(index), path })
  const [fit, bytes, json] = await loadInTurns(
    [
      { origin, describe, connections },
      { origin: bare.origin, describe: at('/bytes'), connections },
      { origin: bare.origin, describe: at('/json'), connections },
    ],
    seconds,
  )
  if (!fit || !bytes || !json) throw new Trouble('A load is missing.')
  await bare.stop()
  say(`  ${fit.requests} requests, ${(answer.length / 1024).toFixed(1)} kB each`)
  return { fit, bytes, json, answerKb: answer.length / 1024 }
}

/** Replacements and the fit of the same kind in the same tank, in turns. */
export async function measureReplacements(/** @type {string} */ origin, /** @type {number} */ seconds) {
  const [swap, fit] = await loadInTurns(
    [
      { origin, describe: askForReplacement, connections },
      { origin, describe: askForHeaterAmongItems, connections },
    ],
    seconds,
  )
  if (!swap || !fit) throw new Trouble('A load is missing.')
  return { swap, fit }
}

/** Names of pieces from all over the catalogue. @returns {Promise<{ slug: string, name: string }[]>} */
async function listNames(/** @type {string} */ origin) {
  /** @type {{ slug: string, name: string }[]} */
  const names = []
  /** @type {string | null} */
  let cursor = null
  for (let page = 0; page < 10 && (page === 0 || cursor !== null); page += 1) {
    const after = cursor === null ? '' : `&cursor=${encodeURIComponent(cursor)}`
    const text = await fetchText(origin, { method: 'GET', path: `/api/v1/gear?limit=100${after}` })
    const list = JSON.parse(text)
    for (const { slug, brand, model } of list.items) names.push({ slug, name: `${brand} ${model}` })
    cursor = list.next ?? null
  }
  if (names.length === 0) throw new Trouble('The list of gear is empty.')
  return names
}

/** Misspelt names, one at a time, against reading one piece by its key. */
export async function measureSearch(/** @type {string} */ origin, /** @type {number} */ seconds) {
  const names = await listNames(origin)
  const nameAt = (/** @type {number} */ index) => names[(index * 31) % names.length] ?? { slug: '', name: '' }
  /** @type {Describe} */
  const search = (index) => ({
    method: 'GET',
    path: `/api/v1/gear?q=${encodeURIComponent(misspell(nameAt(index).name, index))}`,
  })
  /** @type {Describe} */
  const read = (index) => ({ method: 'GET', path: `/api/v1/gear/${nameAt(index).slug}` })
  const [found, one] = await loadInTurns(
    [
      { origin, describe: search, connections: 1 },
      { origin, describe: read, connections: 1 },
    ],
    seconds,
  )
  if (!found || !one) throw new Trouble('A load is missing.')
  return { search: found, read: one }
}
