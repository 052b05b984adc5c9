import { join } from 'node:path'
import { ensureBuild } from './lib/build.mjs'
import { checkout } from './lib/checkout.mjs'
import { ensureDependencies } from './lib/dependencies.mjs'
import { live } from './lib/lifecycle.mjs'
import { requireSetpriv, runStep } from './lib/processes.mjs'
import { ensureRequirements, requireNode } from './lib/requirements.mjs'

/** Playwright on a build of the present sources; arguments are passed on to it. */
await live(
  async () => {
    requireNode()
    requireSetpriv()
    await ensureRequirements(['postgresql', 'chromium'])
    await ensureDependencies()
    await ensureBuild()
    const playwright = join(checkout, 'node_modules/@playwright/test/cli.js')
    return runStep(process.execPath, [playwright, 'test', ...process.argv.slice(2)], { cwd: checkout })
  },
  { onSignal: () => 130 },
)
