import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { assessCandidate } from '#shared/engine/candidates'
import { setBench } from '#shared/engine/bench'
import { getRules } from '#shared/engine/checks/index'
import { fitCheck } from '#shared/engine/fit'
import { createScene } from '#shared/engine/scene'
import { findContradictions } from '#shared/engine/setup/contradictions'
import { giveValue } from '#shared/engine/setup/give'
import { findTurn } from '#shared/engine/turns/find-turn'
import type { Piece, Setup } from '#shared/engine/types'
import { findSetupField } from '#shared/kinds/setup-fields'
import { kindKeys } from '#shared/kinds/index'
import { anyHeater, anySetup, pieceOf } from '../arbitraries'

const patienceMs = 240_000

const anyKind: fc.Arbitrary<Piece> = fc.oneof(
  { weight: 6, arbitrary: anyHeater },
  ...kindKeys.map((kind) => ({ weight: 1, arbitrary: pieceOf(kind, 10) })),
)

function search(setup: Setup, what: Piece) {
  const bench = setBench(setup, what.kind)
  const assessed = assessCandidate(bench, what)
  const judgeAnew = (change: (setup: Setup) => Setup) =>
    assessCandidate(setBench(change(setup), what.kind), what).verdict
  return { bench, assessed, turn: findTurn(bench.scene, assessed, judgeAnew) }
}

describe('what is said to turn a verdict', () => {
  it(
    'does so in a setup that says it, contradicts nothing, and one step less does not',
    () => {
      let found = 0
      fc.assert(
        fc.property(anySetup, anyKind, (setup, what) => {
          const { bench, assessed, turn } = search(setup, what)
          if (!turn) return
          found += 1
          const { knob, to, short } = turn
          const changed = knob.give(setup, to)
          expect(findContradictions(changed)).toEqual([])
          expect(fitCheck(changed, what).verdict, knob.path).toBe(turn.verdict)
          const { plan } = setBench(knob.give(setup, short), what.kind).scene
          const others = plan.items.filter(({ id }) => bench.scene.others.some((other) => other.id === id))
          const outcomes = getRules(what.kind).rules.map(
            (rule) => rule.judge(createScene(plan, others), assessed.candidate)?.outcome,
          )
          const wanted = assessed.verdict === 'no' ? ['fail'] : ['fail', 'change']
          expect(
            outcomes.some((outcome) => outcome && wanted.includes(outcome)),
            knob.path,
          ).toBe(true)
        }),
        { numRuns: 600, seed: 20261201 },
      )
      // A property that nothing meets proves nothing.
      expect(found).toBeGreaterThan(10)
    },
    patienceMs,
  )

  it(
    'is there for a heater wherever another room, water or chamber would do',
    () => {
      let asked = 0
      const paths = ['room.coldestC', 'tank.chambers.0.lengthMm', 'tank.chambers.0.waterDepthMm']
      fc.assert(
        fc.property(anySetup, anyHeater, (setup, what) => {
          const { assessed, turn } = search(setup, what)
          if (assessed.verdict !== 'no' || turn) return
          const wrong = assessed.judged.filter(({ outcome }) => outcome === 'fail').map(({ rule }) => rule.id)
          for (const path of paths) {
            // A longer chamber stretches a tank of known volume, which is nothing to build a tank for.
            if (wrong.join() !== (path === 'room.coldestC' ? 'heater.power' : 'heater.space')) continue
            const attribute = findSetupField(path)?.attribute
            const isThere = !path.includes('chambers') || setup.tank.specs['chambers'] !== undefined
            if (attribute?.type !== 'measure' || !isThere) continue
            const [low, high] = attribute.usual
            for (let share = 0; share <= 1; share += 0.125) {
              const changed = giveValue(setup, path, low + share * (high - low))
              if (findContradictions(changed).length > 0) continue
              const now = setBench(setup, 'heater').scene.plan
              // A colder room or a smaller chamber is nobody's wish.
              if (path === 'room.coldestC' && low + share * (high - low) < now.room.coldestC) continue
              const outcomes = getRules('heater').rules.map(
                (rule) => rule.judge(setBench(changed, 'heater').scene, { piece: what, quantity: 1 })?.outcome,
              )
              asked += 1
              expect(outcomes.includes('fail') || fitCheck(changed, what).verdict === 'unknown', path).toBe(true)
            }
          }
        }),
        { numRuns: 150, seed: 20 },
      )
      // Else nothing was asked at all.
      expect(asked).toBeGreaterThan(20)
    },
    patienceMs,
  )
})
