import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { getRules } from '#shared/engine/checks/index'
import { judge } from '#shared/engine/judge'
import { createScene, type Scene } from '#shared/engine/scene'
import { findContradictions } from '#shared/engine/setup/contradictions'
import { giveValue } from '#shared/engine/setup/give'
import { resolve } from '#shared/engine/setup/resolve'
import type { Setup } from '#shared/engine/types'
import { findSetupField } from '#shared/kinds/setup-fields'
import { anyCorePiece, anyHeater, anySetup } from '../arbitraries'
import { sceneFor } from '../build'

const steps = 5

/** Values that somebody might have said at a path, from the published usual ranges and options of the setup's fields. */
function listUsual(path: string): readonly (number | string)[] {
  const attribute = findSetupField(path)?.attribute
  if (attribute?.type === 'choice')
    return attribute.options.map(({ value }) => (attribute.numeric ? Number(value) : value))
  if (attribute?.type !== 'measure') return []
  const [low, high] = attribute.usual
  return Array.from({ length: steps }, (_, index) => low + ((high - low) * index) / (steps - 1))
}

/** Rock and sand count for the water only once both are said, so that saying them is a change of its own. */
const isFilling = (path: string) => path === 'goals.rockKg' || path === 'goals.sandDepthMm'

const sceneOf = (setup: Setup, others: Scene['others']) => createScene(resolve(setup), others)

/** These judge many setups over. */
const patienceMs = 240_000

describe('an assumed value', () => {
  it(
    'condemns no piece that a usual value would let pass, unless the rest of what was said rules that value out',
    () => {
      fc.assert(
        fc.property(anySetup, anyCorePiece, (setup, piece) => {
          const scene = sceneFor(setup, piece.kind)
          const { plan, others } = scene
          const failing = getRules(piece.kind).rules.filter(
            (rule) => judge(scene, rule, { piece, quantity: 1 })?.outcome === 'fail',
          )
          if (failing.length === 0) return
          for (const path of plan.assumed.keys())
            for (const value of listUsual(path)) {
              const said = giveValue(plan.setup, path, value)
              if (findContradictions(said).length > 0) continue
              const varied = sceneOf(said, others)
              for (const rule of failing) {
                const outcome = rule.judge(varied, { piece, quantity: 1 })?.outcome
                expect(outcome, `${rule.id} with ${path} ${value}`).not.toBe('pass')
              }
            }
        }),
        { numRuns: 60 },
      )
    },
    patienceMs,
  )

  it(
    'is named wherever an outcome rests on it',
    () => {
      fc.assert(
        fc.property(anySetup, anyCorePiece, (setup, piece) => {
          const { plan, others } = sceneFor(setup, piece.kind)
          // Everything that was assumed is said, so that one thing at a time can be said differently.
          let whole = plan.setup
          for (const [path, value] of plan.assumed)
            if (!isFilling(path) && findSetupField(path) && !Array.isArray(value))
              whole = giveValue(whole, path, value as string | number | boolean)
          const scene = sceneOf(whole, others)
          const rests = getRules(piece.kind).rules.flatMap((rule) => {
            const unsaid = judge(createScene(plan, others), rule, { piece, quantity: 1 })
            const before = rule.judge(scene, { piece, quantity: 1 })?.outcome
            return unsaid && unsaid.outcome === before ? [{ rule, before, named: new Set(unsaid.assumed()) }] : []
          })
          for (const path of plan.assumed.keys()) {
            if (isFilling(path)) continue
            for (const value of listUsual(path)) {
              const said = giveValue(whole, path, value)
              if (findContradictions(said).length > 0) continue
              const varied = sceneOf(said, others)
              for (const { rule, before, named } of rests) {
                if (named.has(path)) continue
                const after = rule.judge(varied, { piece, quantity: 1 })?.outcome
                if (after !== 'nodata') expect(after, `${rule.id} with ${path} ${value}`).toBe(before)
              }
            }
          }
        }),
        { numRuns: 40 },
      )
    },
    patienceMs,
  )

  it(
    'is stated with the value from which on the check is kept',
    () => {
      fc.assert(
        fc.property(anySetup, anyHeater, (setup, piece) => {
          const scene = sceneFor(setup, 'heater')
          for (const rule of getRules('heater').rules) {
            const condition = judge(scene, rule, { piece, quantity: 1 })?.condition?.()
            const [turn, second] = condition ?? []
            if (!turn || second || typeof turn.turnsAt !== 'number' || turn.toward === null) continue
            const step = 1e-6 * Math.max(1, Math.abs(turn.turnsAt)) * (turn.toward === 'more' ? 1 : -1)
            const outcomeAt = (value: number) =>
              rule.judge(sceneOf(giveValue(scene.plan.setup, turn.path, value), scene.others), { piece, quantity: 1 })
                ?.outcome
            expect(outcomeAt(turn.turnsAt + step), rule.id).toBe('pass')
            expect(outcomeAt(turn.turnsAt - 2 * step), rule.id).not.toBe('pass')
          }
        }),
        { numRuns: 80 },
      )
    },
    patienceMs,
  )
})
