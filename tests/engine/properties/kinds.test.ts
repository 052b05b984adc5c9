import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { getRules } from '#shared/engine/checks/index'
import { fit, fitCheck } from '#shared/engine/fit'
import { judge, type Judged } from '#shared/engine/judge'
import type { Rule } from '#shared/engine/rule'
import { createScene, type Scene } from '#shared/engine/scene'
import { resolve } from '#shared/engine/setup/resolve'
import { giveValue } from '#shared/engine/setup/give'
import { findContradictions } from '#shared/engine/setup/contradictions'
import type { Item, Outcome, Piece, Setup } from '#shared/engine/types'
import { findSetupField } from '#shared/kinds/setup-fields'
import { kindKeys, type KindKey } from '#shared/kinds/index'
import { createPrinter } from '#shared/units/print'
import { anySetup, pieceOf } from '../arbitraries'
import { item, piece, sceneFor, wholeSetup } from '../build'
import { demoPieces } from '../demo-catalogue'

const rank: Readonly<Record<Outcome, number>> = { pass: 0, change: 1, nodata: 2, fail: 3 }
const kinds = kindKeys.filter(
  (kind) => !['tank', 'heater', 'temperature-controller', 'power-strip', 'light'].includes(kind),
)
const patienceMs = 120_000
const words = createPrinter('metric')

/** Setups in which these kinds meet each other. */
const setupOfKinds: fc.Arbitrary<Setup> = fc
  .tuple(
    anySetup,
    fc.array(
      fc
        .constantFrom<KindKey>(
          'sand',
          'scraper',
          'ro-unit',
          'booster-pump',
          'wavemaker',
          'test-kit',
          'rock',
          'light',
          'light-controller',
          'light-mount',
          'skimmer',
        )
        .chain((kind) => fc.tuple(pieceOf(kind, 7), fc.constantFrom<Item['state']>('have', 'planned', 'gone'))),
      { maxLength: 5 },
    ),
  )
  .map(([setup, more]) => ({
    ...setup,
    items: more.map(([what, state], index) => item(`more-${index}`, what, { state })),
  }))
const anyOfKinds = fc.constantFrom(...kinds).chain((kind) => pieceOf(kind, 8))
const anyKind = fc.constantFrom(...kindKeys).chain((kind) => pieceOf(kind, 8))

/** Rock and sand count for the water only once both are said, so that saying them is a change of its own. */
const isBedding = (path: string) => path === 'goals.rockKg' || path === 'goals.sandDepthMm'

const judgeIn = (scene: Scene, rule: Rule, what: Piece) =>
  judge(scene, rule, { piece: what, quantity: 1, mayMultiply: true })

const tell = (judged: Judged | null) =>
  judged && {
    outcome: judged.outcome,
    eitherWay: judged.eitherWay,
    measured: judged.judgement.measured ?? null,
    limit: judged.judgement.limit ?? null,
    missing: judged.judgement.missing ?? [],
    says: judged.judgement.say(words),
    cautions: (judged.judgement.cautions ?? []).map((say) => say(words)),
  }

describe('a rule of any kind', () => {
  it(
    'reads what it says it reads, and nothing else of the piece',
    () => {
      fc.assert(
        fc.property(setupOfKinds, anyKind, (setup, what) => {
          const scene = sceneFor(setup, what.kind)
          for (const rule of getRules(what.kind).rules) {
            const read = Object.entries(what.specs).filter(([key]) => rule.reads.includes(key))
            const restricted = { ...what, specs: Object.fromEntries(read) }
            expect(tell(judgeIn(scene, rule, restricted)), rule.id).toEqual(tell(judgeIn(scene, rule, what)))
          }
        }),
        { numRuns: 250 },
      )
    },
    patienceMs,
  )

  it('reads so where several chambers are to choose from, too', () => {
    const chamber = (id: string, waterDepthMm: number) => ({
      id,
      lengthMm: 150,
      widthMm: 110,
      waterDepthMm,
      heightMm: 390,
    })
    const scene = sceneFor(wholeSetup({ chambers: [chamber('deep', 330), chamber('low', 180)] }), 'skimmer')
    const depth = fc.integer({ min: 100, max: 350 })
    fc.assert(
      fc.property(depth, depth, fc.integer({ min: 60, max: 140 }), (one, other, lengthMm) => {
        const depths = { waterDepthMinMm: Math.min(one, other), waterDepthMaxMm: Math.max(one, other) }
        const what = piece('skimmer', { lengthMm, widthMm: 80, heightMm: 300, ratedVolumeL: 90, ...depths })
        for (const rule of getRules('skimmer').rules) {
          const read = Object.entries(what.specs).filter(([key]) => rule.reads.includes(key))
          const restricted = judgeIn(scene, rule, { ...what, specs: Object.fromEntries(read) })
          const whole = judgeIn(scene, rule, what)
          expect(tell(restricted), rule.id).toEqual(tell(whole))
          expect(restricted?.judgement.placement, rule.id).toEqual(whole?.judgement.placement)
        }
      }),
    )
  })

  it(
    'names among its uses every assumed part of the setup that its outcome turns on',
    () => {
      fc.assert(
        fc.property(setupOfKinds, anyOfKinds, (setup, what) => {
          const scene = sceneFor(setup, what.kind)
          const { plan, others } = scene
          // Everything assumed is said, so that one thing at a time can be said differently.
          let whole = plan.setup
          for (const [path, value] of plan.assumed)
            if (findSetupField(path) && !Array.isArray(value))
              whole = giveValue(whole, path, value as string | number | boolean)
          const said = createScene(resolve(whole), others)
          for (const path of plan.assumed.keys()) {
            const attribute = findSetupField(path)?.attribute
            if (isBedding(path) || attribute?.type !== 'measure') continue
            for (const value of attribute.usual) {
              const other = giveValue(whole, path, value)
              if (findContradictions(other).length > 0) continue
              const varied = createScene(resolve(other), others)
              const finding = (rule: Rule, at: Scene) => {
                const found = rule.judge(at, { piece: what, quantity: 1 })
                return found && [found.outcome, found.measured ?? null]
              }
              for (const rule of getRules(what.kind).rules) {
                const uses = rule.uses.some(
                  (use) =>
                    use === path ||
                    (use.includes('*') &&
                      path.startsWith(use.split('*')[0] ?? '') &&
                      path.endsWith(use.split('*')[1] ?? '')),
                )
                if (uses) continue
                expect(finding(rule, varied), `${rule.id} with ${path} ${value}`).toEqual(finding(rule, said))
              }
            }
          }
        }),
        { numRuns: 200 },
      )
    },
    patienceMs,
  )

  it(
    'finds the same in both unit systems and in any order of items',
    () => {
      fc.assert(
        fc.property(setupOfKinds, anyOfKinds, (setup, what) => {
          const findings = (one: Setup) =>
            fitCheck(one, what).checks.map(({ id, outcome, measured, limit, margin }) => ({
              id,
              outcome,
              measured,
              limit,
              margin,
            }))
          expect(findings({ ...setup, units: 'us' })).toEqual(findings({ ...setup, units: 'metric' }))
          const outcomes = (one: Setup) => fitCheck(one, what).checks.map(({ id, outcome }) => [id, outcome])
          const { items } = setup
          const single = new Set(items.map((one) => one.piece.kind)).size === items.length
          if (single) expect(outcomes({ ...setup, items: [...items].reverse() })).toEqual(outcomes(setup))
        }),
        { numRuns: 60 },
      )
    },
    patienceMs,
  )
})

const outcomeOf = (setup: Setup, what: Piece, id: string, options = {}) => {
  const rule = getRules(what.kind).rules.find((one) => one.id === id)
  return rule?.judge(sceneFor(setup, what.kind), { piece: what, quantity: 1, mayMultiply: true, ...options })
}
const rankOf = (...asked: Parameters<typeof outcomeOf>) => rank[outcomeOf(...asked)?.outcome ?? 'nodata']
const side = (min: number, max: number) => fc.integer({ min, max })

describe('a larger stand', () => {
  it('never lets a tank stand over that stood on it', () => {
    fc.assert(
      fc.property(side(300, 900), side(300, 900), side(0, 400), side(0, 400), (length, width, longer, wider) => {
        const stand = (topLengthMm: number, topWidthMm: number) => piece('stand', { topLengthMm, topWidthMm })
        expect(rankOf(wholeSetup(), stand(length + longer, width + wider), 'stand.footprint')).toBeLessThanOrEqual(
          rankOf(wholeSetup(), stand(length, width), 'stand.footprint'),
        )
      }),
      { numRuns: 300 },
    )
  })
})

describe('more light', () => {
  it('is never too dim where less was not, nor too bright where it can be dimmed', () => {
    const layouts = fc.constantFrom('point', 'strip', 'panel')
    fc.assert(
      fc.property(
        layouts,
        side(20, 150),
        side(1, 1500),
        side(1, 1500),
        side(40, 400),
        (layout, beam, less, more, high) => {
          const light = (ppfdUmol: number) =>
            piece('light', {
              layout,
              lengthMm: 300,
              widthMm: 100,
              beamAngleDeg: beam,
              ppfdUmol,
              ppfdAtMm: 300,
              dimmable: true,
            })
          const at = (ppfdUmol: number) =>
            rankOf(wholeSetup(), light(ppfdUmol), 'light.intensity', { mountHeightMm: high, mayMultiply: false })
          expect(at(less + more)).toBeLessThanOrEqual(at(less))
        },
      ),
      { numRuns: 60 },
    )
  })
})

describe('a wider bore', () => {
  it('never lowers the turnover of the same curve', () => {
    fc.assert(
      fc.property(
        side(5, 60),
        side(1, 30),
        side(1, 5),
        side(200, 6000),
        side(150, 330),
        (bore, wider, headM, most, level) => {
          const chambers = [{ id: 'rear', lengthMm: 120, widthMm: 100, waterDepthMm: level, heightMm: 390 }]
          const flowCurve = [
            { headM, flowLph: 0 },
            { headM: 0, flowLph: most },
          ]
          const pump = (boreMm: number) =>
            piece('return-pump', { lengthMm: 60, widthMm: 50, heightMm: 60, dcControl: false, flowCurve, boreMm })
          const turnover = (boreMm: number) =>
            outcomeOf(wholeSetup({ chambers }), pump(boreMm), 'return-pump.flow')?.measured as number
          expect(turnover(bore + wider)).toBeGreaterThanOrEqual(turnover(bore) - 1e-9)
        },
      ),
      { numRuns: 150 },
    )
  })
})

describe('more room', () => {
  it('never keeps a body out that fitted', () => {
    const sizes = fc.record({
      lengthMm: side(50, 250),
      widthMm: side(50, 160),
      waterDepthMm: side(60, 340),
      heightMm: fc.constant(390),
    })
    const more = fc.record({
      key: fc.constantFrom('lengthMm', 'widthMm', 'waterDepthMm' as const),
      byMm: fc.oneof(fc.double({ min: 0.001, max: 1, noNaN: true }), side(1, 200)),
    })
    const body = fc.record({ lengthMm: side(20, 200), widthMm: side(20, 140), heightMm: side(20, 250) })
    const kind = fc.constantFrom('return-pump', 'skimmer', 'auto-top-off' as const)
    fc.assert(
      fc.property(kind, sizes, more, body, side(1, 2), (of, chamber, { key, byMm }, sides, quantity) => {
        const inChamber = (rear: Readonly<Record<string, unknown>>) =>
          wholeSetup({ chambers: [{ id: 'rear', ...rear }] })
        const at = (rear: Readonly<Record<string, unknown>>) =>
          rankOf(inChamber(rear), piece(of, sides), `${of}.space`, { quantity })
        expect(at({ ...chamber, [key]: chamber[key] + byMm })).toBeLessThanOrEqual(at(chamber))
      }),
      { numRuns: 400 },
    )
  })
})

describe('the demo catalogue', () => {
  const of = (kind: KindKey) => demoPieces.filter((one) => one.kind === kind)
  const there = [
    ...(['return-pump', 'sand', 'scraper', 'ro-unit', 'light'] as const).map((kind) =>
      item(kind, of(kind)[1] ?? piece(kind, {})),
    ),
    // So strong that fine sand blows about.
    item('wavemaker', piece('wavemaker', { flowMinLph: 2500, flowMaxLph: 4000, wallMinMm: 4, wallMaxMm: 15 })),
  ]
  const setups: Readonly<Record<string, Setup>> = {
    'of a volume alone': { units: 'us', tank: { specs: {}, volumeL: 75.7 }, items: [] },
    'with gear in it': wholeSetup({}, { items: there }),
  }

  for (const [name, setup] of Object.entries(setups))
    it.each(kindKeys)(
      `answers in a setup ${name} about all %s pieces as about each`,
      (kind) => {
        // Of large kinds every third piece, so that all families are met.
        const pieces = of(kind).filter((_, index) => of(kind).length < 40 || index % 3 === 0)
        const { answers, counts } = fit(setup, kind, pieces, { limit: pieces.length, offset: 0 })
        expect(answers).toHaveLength(pieces.length)
        for (const answer of answers) {
          const one = pieces.find(({ gear }) => gear?.slug === answer.gear?.slug)
          expect(one && fitCheck(setup, one)).toEqual(answer)
        }
        for (const verdict of ['fits', 'changes', 'no', 'unknown'] as const)
          expect(
            answers.filter((answer) => answer.verdict === verdict),
            verdict,
          ).toHaveLength(counts[verdict])
      },
      patienceMs,
    )
})
