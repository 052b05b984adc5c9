import { cpSync, mkdtempSync, rmSync, symlinkSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { checkout } from '../lib/checkout.mjs'

const parts = [
  'shared',
  'server',
  'seeds',
  'scripts',
  'tests',
  'package.json',
  'tsconfig.base.json',
  'tsconfig.json',
  'vitest.config.ts',
]

/** A copy of the tree to put faults into, thrown away at the end: the checkout itself is never touched. */
export function copyTree(/** @type {(undo: () => unknown) => void} */ defer) {
  const folder = mkdtempSync(join(tmpdir(), 'stillfits-mutate-'))
  defer(() => rmSync(folder, { recursive: true, force: true }))
  for (const part of parts) cpSync(join(checkout, part), join(folder, part), { recursive: true })
  symlinkSync(join(checkout, 'node_modules'), join(folder, 'node_modules'))
  return folder
}
