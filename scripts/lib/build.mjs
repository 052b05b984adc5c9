import { createHash } from 'node:crypto'
import { readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { checkout } from './checkout.mjs'
import { withLock } from './lock.mjs'
import { runQuietly } from './processes.mjs'
import { formatSeconds, say, Trouble } from './say.mjs'

const sources = ['src', 'server', 'shared', 'seeds', 'public', 'index.html', 'vite.config.ts', 'package.json']
const settings = ['package-lock.json', 'tsconfig.base.json', 'src/tsconfig.json']
const stampFile = join(checkout, 'dist', '.stamp')

/** @returns {string[]} */
function listFiles(/** @type {string} */ path) {
  const stat = statSync(join(checkout, path), { throwIfNoEntry: false })
  if (!stat) return []
  if (stat.isFile()) return [path]
  return readdirSync(join(checkout, path))
    .sort()
    .flatMap((name) => listFiles(join(path, name)))
}

/** By content, not by time: a checkout of the same sources needs no new build. */
function hashSources() {
  const hash = createHash('sha256').update(process.versions.node)
  for (const file of [...sources, ...settings].flatMap(listFiles)) {
    const content = readFileSync(join(checkout, file))
    hash.update(`${file}\0${content.length}\0`).update(content)
  }
  return hash.digest('hex')
}

function readStamp() {
  try {
    return readFileSync(stampFile, 'utf8')
  } catch {
    return null
  }
}

/** Builds the client, its server-side entry and the server, unless the last build was of the same sources. */
export async function ensureBuild() {
  await withLock('build', async () => {
    const hash = hashSources()
    if (readStamp() === hash) return
    const startedMs = Date.now()
    say('Building …')
    // Removed first: a build cut short must not pass for a whole one.
    rmSync(stampFile, { force: true })
    const vite = join(checkout, 'node_modules/vite/bin/vite.js')
    const env = { NODE_ENV: 'production' }
    const { code, output } = await runQuietly(process.execPath, [vite, 'build', '--app'], { cwd: checkout, env })
    if (code !== 0) throw new Trouble(`The build failed.\n${output}`)
    writeFileSync(stampFile, hash)
    say(`Built (${formatSeconds(startedMs)}).`)
  })
}
