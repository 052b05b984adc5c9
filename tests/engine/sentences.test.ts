import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { fitCheck } from '#shared/engine/fit'
import { report } from '#shared/engine/report'
import type { Answer, Report } from '#shared/engine/types'
import { anyCorePiece, anyPiece, anySetup } from './arbitraries'
import { toPlain } from './build'

/** These judge whole setups many times over. */
const patienceMs = 240_000

const listOfAnswer = ({ summary, checks, knockOns, cautions }: Answer): readonly string[] => [
  summary,
  ...checks.map(({ message }) => message),
  ...knockOns.map(({ message }) => message),
  ...cautions,
]

const listOfReport = ({ items, missing, needs, budgets, cautions, assumptions }: Report): readonly string[] => [
  ...items.flatMap(({ checks, cautions: own }) => [...checks.map(({ message }) => message), ...own]),
  ...missing.map(({ message }) => message),
  ...needs.map(({ message }) => message),
  ...Object.values(budgets).map(({ message }) => message),
  ...cautions,
  ...assumptions.map(({ message }) => message),
]

const faults: readonly (readonly [string, RegExp])[] = [
  ['a value that is none', /\b(undefined|NaN|Infinity|null|true|false)\b|\[object/],
  ['one of several', /(^|[^\d.–])1 (outlets|plugs|pieces|packs|litres|units|kits|switched outlets|more outlets)\b/],
  ['several of one', /(^|[^\d.])([02-9]|\d\d+) (outlet|plug|piece|pack|unit|kit)\b(?! )/],
  ['“a” before a vowel sound', /\ba (8|11|18)(\D|$)/],
  ['two spaces', / {2}/],
  ['two stops', /\.\.|\. \./],
  ['a space before a stop', / [.,;:]/],
  ['a key in place of words', /[a-z]{2,}[A-Z]|\b(?!side-by-side)[a-z]+-[a-z]+-[a-z]+\b/],
  ['a minus that is a hyphen', /(^| )-\d/],
]

function expectSound(text: string): void {
  const plain = toPlain(text)
  expect(plain).toMatch(/^[A-Z0-9“−]/)
  expect(plain).toMatch(/[.]$/)
  for (const [fault, pattern] of faults) expect(plain, fault).not.toMatch(pattern)
}

describe('every sentence', () => {
  it(
    'of an answer reads well in both unit systems',
    () => {
      fc.assert(
        fc.property(anySetup, fc.oneof(anyCorePiece, anyPiece), (setup, piece) => {
          for (const units of ['us', 'metric'] as const)
            for (const text of listOfAnswer(fitCheck({ ...setup, units }, piece))) expectSound(text)
        }),
        { numRuns: 80 },
      )
    },
    patienceMs,
  )

  it(
    'of a report reads well in both unit systems',
    () => {
      fc.assert(
        fc.property(anySetup, (setup) => {
          for (const units of ['us', 'metric'] as const)
            for (const text of listOfReport(report({ ...setup, units }))) expectSound(text)
        }),
        { numRuns: 40 },
      )
    },
    patienceMs,
  )
})
