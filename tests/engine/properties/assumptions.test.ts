import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { getRules } from '#shared/engine/checks/index'
import { judge } from '#shared/engine/judge'
import { createScene, type Scene } from '#shared/engine/scene'
import { findContradictions } from '#shared/engine/setup/contradictions'
import { giveValue } from '#shared/engine/setup/give'
import { resolve } from '#shared/engine/setup/resolve'
import type { Piece, Setup } from '#shared/engine/types'
import { findSetupField } from '#shared/kinds/setup-fields'
import { kindKeys } from '#shared/kinds/index'
import { anyCorePiece, anyHeater, anySetup, pieceOf } from '../arbitraries'
import { piece, sceneFor } from '../build'

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

/** A stand that is too weak for the tank as it is usually filled is refused, however little water somebody might mean. */
const isOverload = (ruleId: string, path: string) => ruleId === 'stand.load' && path === 'tank.waterLineMm'

const sceneOf = (setup: Setup, others: Scene['others']) => createScene(resolve(setup), others)

/** These judge many setups over. */
const patienceMs = 240_000

/** Of all kinds; a light takes a model of the whole tank each time it is asked about. */
const anyKind: fc.Arbitrary<Piece> = fc.oneof(
  ...kindKeys.map((kind) => ({ weight: kind === 'light' ? 1 : 5, arbitrary: pieceOf(kind, 10) })),
)

/** Rules that fail a piece in a setup although somebody might have said something usual with which they are kept. */
function listCondemned(setup: Setup, piece: Piece, valuesOf: (path: string) => readonly (number | string)[]) {
  const scene = sceneFor(setup, piece.kind)
  const { plan, others } = scene
  const candidate = { piece, quantity: 1 }
  const failing = getRules(piece.kind).rules.filter((rule) => judge(scene, rule, candidate)?.outcome === 'fail')
  if (failing.length === 0) return []
  return [...plan.assumed.keys()].flatMap((path) =>
    valuesOf(path).flatMap((value) => {
      const said = giveValue(plan.setup, path, value)
      if (findContradictions(said).length > 0) return []
      const varied = sceneOf(said, others)
      return failing.flatMap((rule) =>
        !isOverload(rule.id, path) && rule.judge(varied, candidate)?.outcome === 'pass'
          ? [`${rule.id} with ${path} ${value}`]
          : [],
      )
    }),
  )
}

describe('an assumed value', () => {
  it(
    'condemns no piece that a usual value would let pass, unless the rest of what was said rules that value out',
    () => {
      fc.assert(
        fc.property(anySetup, anyCorePiece, (setup, piece) => {
          expect(listCondemned(setup, piece, listUsual)).toEqual([])
        }),
        { numRuns: 60 },
      )
    },
    patienceMs,
  )

  it(
    'condemns no piece of any kind, whatever usual value somebody might have said',
    () => {
      fc.assert(
        fc.property(anySetup, anyKind, fc.integer({ min: 0, max: 99 }), (setup, piece, at) => {
          // Points that lie nowhere in particular between the ends of a usual range.
          const between = (path: string) => {
            const attribute = findSetupField(path)?.attribute
            if (attribute?.type !== 'measure') return listUsual(path)
            const [low, high] = attribute.usual
            return [at, (at + 31) % 100, (at + 67) % 100].map((share) => low + (share / 99) * (high - low))
          }
          expect(listCondemned(setup, piece, between)).toEqual([])
        }),
        { numRuns: 250, seed: 20261201 },
      )
    },
    patienceMs,
  )

  it('condemns no stand that a tank of the volume would stand on, were it neither longest nor shortest', () => {
    // 75.7 L 1.5 times as long as wide, as is assumed, are about 590 × 400 mm: longer than the top either way. A tank
    // 500 mm long and as wide and deep as that leaves it is within 560 × 580 mm.
    const setup: Setup = { units: 'metric', tank: { specs: {}, volumeL: 75.7 }, items: [] }
    const judgeOn = (topLengthMm: number, topWidthMm: number) => {
      const scene = sceneFor(setup, 'stand')
      const [rule] = getRules('stand').rules.filter(({ id }) => id === 'stand.footprint')
      return rule && judge(scene, rule, { piece: piece('stand', { topLengthMm, topWidthMm }), quantity: 1 })?.outcome
    }
    expect(judgeOn(560, 580)).toBe('change')
    // A hair wider than what 75.7 L take where nearly square; and one on which no such tank stands.
    expect(judgeOn(420, 500)).toBe('change')
    expect(judgeOn(250, 300)).toBe('fail')
  })

  it('condemns no magnet for walls that lie between the thinnest and the thickest', () => {
    const scene = sceneFor({ units: 'metric', tank: { specs: {}, volumeL: 75.7 }, items: [] }, 'scraper')
    const magnet = piece('scraper', { form: 'magnet', wallMinMm: 17, wallMaxMm: 17.5 })
    const [rule] = getRules('scraper').rules.filter(({ id }) => id === 'scraper.wall')
    const judged = rule && judge(scene, rule, { piece: magnet, quantity: 1 })
    expect(judged?.outcome).toBe('change')
    const [turn] = judged?.condition?.() ?? []
    expect(turn).toMatchObject({ path: 'tank.wallMm', toward: 'more' })
    // Comparisons of lengths allow 0.05 mm.
    expect(turn?.turnsAt).toBeCloseTo(16.95, 6)
    expect(turn?.until).toBeCloseTo(17.55, 6)
  })

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
