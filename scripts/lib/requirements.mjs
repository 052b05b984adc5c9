import { accessSync, constants, existsSync, readdirSync } from 'node:fs'
import { delimiter, join } from 'node:path'
import { readOutput, runQuietly } from './processes.mjs'
import { say, Trouble } from './say.mjs'

const oldestPostgresMajor = 14

function isExecutable(/** @type {string} */ path) {
  try {
    accessSync(path, constants.X_OK)
    return true
  } catch {
    return false
  }
}

const findOnPath = (/** @type {string} */ name) =>
  (process.env.PATH ?? '')
    .split(delimiter)
    .filter(Boolean)
    .map((folder) => join(folder, name))
    .find(isExecutable)

/** Debian keeps the server's programs off PATH, one folder per version; elsewhere they are on it. */
function findPostgresFolder() {
  const debian = '/usr/lib/postgresql'
  const versions = existsSync(debian) ? readdirSync(debian).filter((name) => /^\d+$/.test(name)) : []
  const folders = versions
    .map(Number)
    .sort((a, b) => b - a)
    .map((version) => join(debian, String(version), 'bin'))
  const onPath = findOnPath('initdb')?.replace(/\/initdb$/, '')
  if (onPath !== undefined) folders.push(onPath)
  return folders.find((folder) => ['initdb', 'postgres', 'psql'].every((name) => isExecutable(join(folder, name))))
}

/** @returns {{ bin: string, major: number } | null} */
export function findPostgres() {
  const bin = findPostgresFolder()
  const version = bin === undefined ? null : readOutput(join(bin, 'postgres'), '--version')
  const major = Number(/(\d+)(\.\d+)?/.exec(version ?? '')?.[1])
  return bin !== undefined && major >= oldestPostgresMajor ? { bin, major } : null
}

/** @returns {string | null} */
export function findChromium() {
  const given = process.env.CHROMIUM_PATH
  if (given) return isExecutable(given) ? given : null
  return findOnPath('chromium') ?? findOnPath('chromium-browser') ?? null
}

const requirements = {
  postgresql: { isThere: () => findPostgres() !== null, name: `PostgreSQL ${oldestPostgresMajor} or newer` },
  chromium: { isThere: () => findChromium() !== null, name: 'Chromium (for the browser tests)' },
}

/** @typedef {keyof typeof requirements} Requirement the Debian package's name */

/**
 * Makes sure that the programs are there, installing Debian's packages when this process may; otherwise one error
 * names all that are missing.
 * @param {readonly Requirement[]} wanted
 */
export async function ensureRequirements(wanted) {
  const listMissing = () => wanted.filter((key) => !requirements[key].isThere())
  const missing = listMissing()
  if (missing.length === 0) return
  const names = (/** @type {readonly Requirement[]} */ keys) => keys.map((key) => requirements[key].name).join(' and ')
  const canInstall = process.getuid?.() === 0 && findOnPath('apt-get') !== undefined
  if (!canInstall) {
    throw new Trouble(
      `Missing on this machine: ${names(missing)}.\nInstall it once, as root on Debian: apt-get install ${missing.join(' ')}`,
    )
  }
  say(`Installing ${names(missing)} with apt-get …`)
  const failure = await installPackages(missing)
  const still = listMissing()
  if (still.length > 0) {
    throw new Trouble(
      `Missing on this machine: ${names(still)}. Installing ${still.join(' ')} did not work.\n${failure}`,
    )
  }
}

/** @returns {Promise<string>} what apt said when it failed, else nothing */
async function installPackages(/** @type {readonly string[]} */ packages) {
  const env = { DEBIAN_FRONTEND: 'noninteractive' }
  const update = await runQuietly('apt-get', ['update', '-q'], { env })
  const install = await runQuietly('apt-get', ['install', '-y', '-q', '--no-install-recommends', ...packages], { env })
  if (install.code === 0) return ''
  return [update, install]
    .filter(({ code }) => code !== 0)
    .map(({ output }) => output.split('\n').slice(-8).join('\n'))
    .join('\n')
}

export function requireNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
  if (major < 20 || (major === 20 && minor < 19)) {
    throw new Trouble(`Stillfits needs Node.js 20.19 or newer; this is ${process.versions.node}.`)
  }
}
