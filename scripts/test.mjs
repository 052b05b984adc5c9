import { ensureBuild } from './lib/build.mjs'
import { runChecks } from './lib/checks.mjs'
import { ensureDependencies } from './lib/dependencies.mjs'
import { live } from './lib/lifecycle.mjs'
import { requireSetpriv } from './lib/processes.mjs'
import { ensureRequirements, requireNode } from './lib/requirements.mjs'
import { complain, describeError, say } from './lib/say.mjs'
import { startTestCluster } from './lib/test-cluster.mjs'
import { runPlaywright, runVitest } from './lib/test-runners.mjs'

/** @typedef {import('./lib/lifecycle.mjs').Life} Life */

const total = { passed: 0, failed: 0 }

/** A step that cannot be done is a failure, and those that do not need it still run. */
async function count(
  /** @type {Life} */ life,
  /** @type {string} */ title,
  /** @type {() => Promise<{ passed: number, failed: number } | void>} */ step,
) {
  say(`\n${title}`)
  try {
    const { passed, failed } = (await step()) ?? { passed: 0, failed: 0 }
    total.passed += passed
    total.failed += failed
    return true
  } catch (error) {
    if (life.isEnding()) throw error
    complain(describeError(error))
    total.failed += 1
    return false
  }
}

await live(
  async (life) => {
    // Whatever ends the run, the count is the last thing said.
    life.defer(() => say(`\n${total.passed} passed, ${total.failed} failed`))
    const isGrounded = await count(life, 'Ground', async () => {
      requireNode()
      requireSetpriv()
      await ensureRequirements(['postgresql', 'chromium'])
      await ensureDependencies()
    })
    if (!isGrounded) return 1
    await count(life, 'Types, lint, import rules, format', runChecks)
    const isBuilt = await count(life, 'Build', ensureBuild)
    const hasDatabase = await count(life, 'Test database', async () => void (await startTestCluster(life.defer)))
    if (hasDatabase) await count(life, 'Engine, units, standards, API and client tests', runVitest)
    if (hasDatabase && isBuilt) await count(life, 'Browser tests on the built application', runPlaywright)
    return total.failed === 0 ? 0 : 1
  },
  {
    onSignal: () => 130,
    onStopping: () => {
      total.failed += 1
      complain('Stopped before the end.')
    },
  },
)
