import { join } from 'node:path'
import { createInterface } from 'node:readline'
import { checkout, dataFolder } from './checkout.mjs'
import { findFreePort } from './ports.mjs'
import { delay, hasEnded, startChild, stopChild } from './processes.mjs'
import { Trouble } from './say.mjs'

/** @typedef {import('./processes.mjs').ChildProcess} ChildProcess */

/** @returns {Promise<Record<string, string>>} what the stand-ins tell a server that is to use them */
function readSettings(/** @type {ChildProcess} */ child) {
  return new Promise((resolve, reject) => {
    if (!child.stdout) throw new Trouble('The stand-ins for mail and files have no output.')
    createInterface(child.stdout).once('line', (line) => resolve(JSON.parse(line)))
    child.once('exit', () => reject(new Trouble('The stand-ins for mail and files did not start.')))
  })
}

/**
 * Local stand-ins for the mail server and the object store, kept alive until the end of `life`. Services that the person
 * named are used instead.
 * @param {Pick<import('./lifecycle.mjs').Life, 'defer' | 'isEnding'>} life
 * @param {{ isBuilt: boolean, folder?: string }} options
 */
export async function startFakes(life, { isBuilt, folder = join(dataFolder, 'services') }, env = process.env) {
  const isDemo = !['0', 'false', 'off'].includes(env.DEMO ?? '')
  if (!isDemo || (env.SMTP_URL && env.S3_ENDPOINT)) return {}
  const args = isBuilt
    ? [join(checkout, 'dist/server/fakes.js')]
    : ['--import', 'tsx', join(checkout, 'server/services/run-fakes.ts')]
  const ports = { FAKE_MAIL_PORT: String(await findFreePort()), FAKE_FILES_PORT: String(await findFreePort()) }
  const start = () =>
    startChild(process.execPath, args, {
      cwd: checkout,
      stdio: ['ignore', 'pipe', 'inherit'],
      env: { FAKES_FOLDER: folder, ...ports },
    })

  let child = start()
  life.defer(() => stopChild(child, 5_000))
  const watch = () =>
    child.once('exit', async () => {
      await delay(500)
      if (life.isEnding() || !hasEnded(child)) return
      child = start()
      watch()
    })
  const settings = await readSettings(child)
  watch()
  const given = Object.keys(settings).filter((name) => (name.startsWith('S3_') ? env.S3_ENDPOINT : env.SMTP_URL))
  for (const name of given) delete settings[name]
  // Which Node the SDK will want one day is no news for whoever starts the site.
  return { ...settings, AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true' }
}
