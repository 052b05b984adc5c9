import { ensureBuild } from './lib/build.mjs'
import { ensureDependencies } from './lib/dependencies.mjs'
import { live } from './lib/lifecycle.mjs'
import { requireSetpriv } from './lib/processes.mjs'
import { requireNode } from './lib/requirements.mjs'
import { say } from './lib/say.mjs'

await live(async () => {
  requireNode()
  requireSetpriv()
  await ensureDependencies()
  await ensureBuild()
  say('dist/ is up to date.')
  return 0
})
