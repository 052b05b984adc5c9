import { ensureDependencies } from './lib/dependencies.mjs'
import { live } from './lib/lifecycle.mjs'
import { requireNode } from './lib/requirements.mjs'

/**
 * Says which faults in the engine its tests would not notice: puts one small fault after another into a copy of the tree
 * and runs the tests that reach it. npm run mutate -- [--sample 400] [--seed 1] [--seconds 120] [--jobs 2]
 * [--files shared/engine/physics] [--tests tests/standards]
 */
await live(
  async (life) => {
    requireNode()
    await ensureDependencies()
    // Only now: it needs packages that may just have been installed.
    const { runMutants } = await import('./mutate/run.mjs')
    await runMutants(process.argv.slice(2), life)
    return 0
  },
  { onSignal: () => 130 },
)
