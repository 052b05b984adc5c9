import { runChecks } from './lib/checks.mjs'
import { ensureDependencies } from './lib/dependencies.mjs'
import { live } from './lib/lifecycle.mjs'
import { requireSetpriv } from './lib/processes.mjs'
import { requireNode } from './lib/requirements.mjs'

await live(
  async () => {
    requireNode()
    requireSetpriv()
    await ensureDependencies()
    const { failed } = await runChecks()
    return failed === 0 ? 0 : 1
  },
  { onSignal: () => 130 },
)
