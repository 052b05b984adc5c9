import { checkout } from './lib/checkout.mjs'
import { ensureDependencies } from './lib/dependencies.mjs'
import { live } from './lib/lifecycle.mjs'
import { requireSetpriv, runStep } from './lib/processes.mjs'
import { ensureRequirements, requireNode } from './lib/requirements.mjs'
import { startTestCluster } from './lib/test-cluster.mjs'

/** Prints how well the search answers the judged queries, class by class, on a throwaway database. */
await live(async (life) => {
  requireNode()
  requireSetpriv()
  await ensureRequirements(['postgresql'])
  await ensureDependencies()
  await startTestCluster(life.defer)
  return runStep(process.execPath, ['--import', 'tsx', 'tests/search/measure.ts'], { cwd: checkout, env: process.env })
})
