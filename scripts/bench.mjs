import { ensureBuild } from './lib/build.mjs'
import { ensureDependencies } from './lib/dependencies.mjs'
import { live } from './lib/lifecycle.mjs'
import { requireSetpriv } from './lib/processes.mjs'
import { ensureRequirements, requireNode } from './lib/requirements.mjs'

/**
 * Measures the built server and the engine, each figure beside a yardstick taken in the same run, so that they can be
 * compared between machines: npm run bench -- [--sizes 1000,10000] [--seconds 3] [--only fit,search]
 */
await live(
  async (life) => {
    requireNode()
    requireSetpriv()
    await ensureRequirements(['postgresql'])
    await ensureDependencies()
    await ensureBuild()
    // Only now: it needs packages that may just have been installed.
    const { runBench } = await import('./bench/run.mjs')
    await runBench(process.argv.slice(2), life)
    return 0
  },
  { onSignal: () => 130 },
)
