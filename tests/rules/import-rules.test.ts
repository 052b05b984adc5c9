import { spawnSync } from 'node:child_process'
import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { dirname, join, resolve } from 'node:path'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'

// A rule that no longer matches anything passes in silence, so each is shown a file that breaks it.
const breaches: readonly { rule: string; file: string; imports: string; needs?: readonly string[] }[] = [
  { rule: 'pure-core', file: 'shared/engine/heat.ts', imports: 'zod' },
  { rule: 'pure-core', file: 'shared/units/clock.ts', imports: 'node:fs' },
  {
    rule: 'pure-core',
    file: 'shared/kinds/heater.ts',
    imports: '../schemas/specs',
    needs: ['shared/schemas/specs.ts'],
  },
  { rule: 'doubts-from-kinds-alone', file: 'shared/unlikely/judge.ts', imports: 'zod' },
  { rule: 'shared-knows-only-zod', file: 'shared/schemas/fit.ts', imports: 'express' },
  { rule: 'server-not-client', file: 'server/http/pages.ts', imports: '../../src/page', needs: ['src/page.ts'] },
  { rule: 'client-not-server', file: 'src/lib/client.ts', imports: '../../server/app', needs: ['server/app.ts'] },
  { rule: 'client-without-node', file: 'src/lib/files.ts', imports: 'node:path' },
  {
    rule: 'product-apart-from-tests-and-demo-data',
    file: 'server/lib/x.ts',
    imports: '../../seeds/a',
    needs: ['seeds/a.ts'],
  },
  { rule: 'product-without-development-packages', file: 'src/lib/check.ts', imports: 'fast-check' },
  { rule: 'scripts-on-bare-node', file: 'scripts/lib/early.mjs', imports: 'pg' },
  { rule: 'express-at-the-edge', file: 'server/modules/gear/gear.service.ts', imports: 'express' },
  { rule: 'drizzle-in-queries', file: 'server/modules/gear/gear.policy.ts', imports: 'drizzle-orm' },
  { rule: 'drizzle-in-queries', file: 'server/modules/fit/fit.service.ts', imports: 'pg' },
  {
    rule: 'tables-in-queries',
    file: 'server/modules/gear/gear.store.ts',
    imports: '../../db/schema/gear',
    needs: ['server/db/schema/gear.ts'],
  },
  {
    rule: 'modules-by-their-services',
    file: 'server/modules/fit/other.service.ts',
    imports: '../gear/gear.queries',
    needs: ['server/modules/gear/gear.queries.ts'],
  },
  {
    rule: 'routes-through-services',
    file: 'server/modules/gear/gear.routes.ts',
    imports: './gear.queries',
    needs: ['server/modules/gear/gear.queries.ts'],
  },
  {
    rule: 'services-without-http',
    file: 'server/modules/kinds/kinds.service.ts',
    imports: '../../http/problem',
    needs: ['server/http/problem.ts'],
  },
  {
    rule: 'leaves-stay-leaves',
    file: 'server/modules/kinds/kinds.presenter.ts',
    imports: './kinds.queries',
    needs: ['server/modules/kinds/kinds.queries.ts'],
  },
  { rule: 'features-apart', file: 'src/features/find/a.ts', imports: '../units/b', needs: ['src/features/units/b.ts'] },
  { rule: 'features-below-app', file: 'src/features/find/c.ts', imports: '../../app/d', needs: ['src/app/d.ts'] },
  {
    rule: 'blocks-below-features',
    file: 'src/components/e.ts',
    imports: '../features/find/f',
    needs: ['src/features/find/f.ts'],
  },
  { rule: 'no-barrels', file: 'src/components/g.ts', imports: './ui', needs: ['src/components/ui/index.ts'] },
  { rule: 'no-circles', file: 'shared/engine/one.ts', imports: './one' },
  { rule: 'nothing-unresolved', file: 'shared/engine/two.ts', imports: './nowhere' },
]

const allowed: readonly { file: string; imports: string; needs?: readonly string[] }[] = [
  { file: 'server/modules/ok/ok.routes.ts', imports: 'express' },
  { file: 'server/modules/ok/ok.queries.ts', imports: 'drizzle-orm' },
  { file: 'server/modules/ok/ok.service.ts', imports: '#shared/kinds/index', needs: ['shared/kinds/index.ts'] },
  { file: 'shared/schemas/ok.ts', imports: 'zod' },
  { file: 'src/features/ok/ok.ts', imports: '../../components/ok', needs: ['src/components/ok.ts'] },
]

interface Violation {
  readonly rule: { readonly name: string }
  readonly from: string
}

const checkout = resolve(import.meta.dirname, '../..')
const folder = mkdtempSync(join(tmpdir(), 'stillfits-rules-'))
let violations: readonly Violation[] = []

function write(file: string, content: string): void {
  mkdirSync(dirname(join(folder, file)), { recursive: true })
  writeFileSync(join(folder, file), content)
}

beforeAll(() => {
  for (const name of ['node_modules', 'package.json', 'tsconfig.json', 'tsconfig.base.json']) {
    symlinkSync(join(checkout, name), join(folder, name))
  }
  const all = [...breaches, ...allowed]
  for (const file of all.flatMap(({ needs = [] }) => needs)) write(file, 'export const value = 1\n')
  for (const { file, imports } of all) write(file, `import '${imports}'\nexport const value = 1\n`)
  const cruiser = join(checkout, 'node_modules/dependency-cruiser/bin/dependency-cruise.mjs')
  const config = join(checkout, '.dependency-cruiser.mjs')
  const args = [cruiser, '--config', config, '--output-type', 'json', 'server', 'src', 'shared', 'scripts']
  const { stdout } = spawnSync(process.execPath, args, { cwd: folder, encoding: 'utf8', maxBuffer: 64e6 })
  violations = (JSON.parse(stdout) as { summary: { violations: Violation[] } }).summary.violations
}, 240_000)

afterAll(() => rmSync(folder, { recursive: true, force: true }))

describe('the import rules', () => {
  test.each(breaches)('refuse $imports in $file ($rule)', ({ rule, file }) => {
    expect(violations.filter(({ from }) => from === file).map((violation) => violation.rule.name)).toContain(rule)
  })

  test.each(allowed)('accept $imports in $file', ({ file }) => {
    expect(violations.filter(({ from }) => from === file)).toEqual([])
  })
})

describe('the lint rules of the pure core', () => {
  const lint = (code: string): string[] => {
    const eslint = join(checkout, 'node_modules/eslint/bin/eslint.js')
    const args = [eslint, '--stdin', '--stdin-filename', join(checkout, 'shared/engine/types.ts'), '--format', 'json']
    const { stdout } = spawnSync(process.execPath, args, { cwd: checkout, input: code, encoding: 'utf8' })
    const [result] = JSON.parse(stdout) as { messages: { ruleId: string }[] }[]
    return result?.messages.map(({ ruleId }) => ruleId) ?? []
  }

  test('refuse the clock and randomness', () => {
    const found = lint('export const a = (): number => Date.now() + Math.random()\n')
    expect(found).toEqual(expect.arrayContaining(['no-restricted-globals', 'no-restricted-properties']))
  }, 240_000)
})
