import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { getRules, listRules } from '#shared/engine/checks/index'
import { judge, type Judged } from '#shared/engine/judge'
import type { Rule } from '#shared/engine/rule'
import type { Scene } from '#shared/engine/scene'
import type { Piece } from '#shared/engine/types'
import { createPrinter } from '#shared/units/print'
import { kindKeys } from '#shared/kinds/index'
import { anyCorePiece, anyPiece, anySetup, pieceOf } from '../arbitraries'
import { sceneFor } from '../build'

const words = createPrinter('metric')

/** What a judgement says, to compare two of them. */
const tell = (judged: Judged | null) =>
  judged && {
    outcome: judged.outcome,
    eitherWay: judged.eitherWay,
    measured: judged.judgement.measured ?? null,
    limit: judged.judgement.limit ?? null,
    missing: judged.judgement.missing ?? [],
    probability: judged.judgement.probability?.(),
    says: judged.judgement.say(words),
    cautions: (judged.judgement.cautions ?? []).map((say) => say(words)),
    condition: judged.condition?.(),
  }

const judgeIn = (scene: Scene, rule: Rule, piece: Piece) =>
  judge(scene, rule, { piece, quantity: 1, mayMultiply: true })

const keep = ({ specs, ...piece }: Piece, isKept: (key: string) => boolean): Piece => ({
  ...piece,
  specs: Object.fromEntries(Object.entries(specs).filter(([key]) => isKept(key))),
})

const lampMayLack = ['ppfdUmol', 'ppfdAtMm', 'photonFluxUmolS', 'beamAngleDeg', 'mountsIncluded', 'widthMm']

/** Attributes whose absence a rule takes for something harmless, on purpose; each with why. */
const harmless: Readonly<Record<string, readonly string[]>> = {
  // No immersion stated: the whole rod has to be under water. No position stated: it must stand, and a caution says so.
  // A form that is not known is a rod's.
  'heater.space': ['minImmersionMm', 'orientation', 'form'],
  // Not known to have a thermostat: a controller in the setup is not counted as a second cut-off.
  'heater.not-too-strong': ['thermostat'],
  // One end of a rating may be left out: one number is the maximum.
  'heater.rated-volume': ['ratedVolumeMinL', 'ratedVolumeMaxL'],
  // Asked for only where the heater has none of its own, and a controller has to carry it.
  'heater.thermostat': ['powerW', 'plugs'],
  // Fewer outlets of its own free fewer of the strip's.
  'temperature-controller.plugs': ['outlets'],
  // The nominal volume and the sizes stand in for each other; so does what the tank weighs dry.
  'tank.volume': [
    'nominalVolumeL',
    'outerLengthMm',
    'outerWidthMm',
    'outerHeightMm',
    'wallMm',
    'waterLineMm',
    'filtration',
    'sump',
    'shape',
  ],
  // A reading and all its photons stand in for each other; a beam angle and a height have usual ones, which are said.
  'light.coverage': lampMayLack,
  'light.intensity': lampMayLack,
  // What its maker asks for goes before the depth that is taken otherwise.
  'return-pump.space': ['minDepthMm'],
  // Not stated: what membranes are usually tested at.
  'ro-unit.output': ['testTdsPpm'],
  // What its maker says of acrylic and what its blades are stand in for each other.
  'scraper.acrylic': ['acrylicSafe', 'blades'],
  // Of several chambers its size chooses one; whether there is room for it is another check's.
  'skimmer.depth': ['lengthMm', 'widthMm', 'heightMm'],
  // A rating and what its maker says it is made for stand in for each other.
  'stand.load': ['loadRatingKg', 'madeForTanks', 'madeForVolumeL'],
  // One that states no least flow runs at its only speed, or nobody knows.
  'wavemaker.flow': ['flowMinLph'],
  'wavemaker.sand': ['flowMinLph', 'flowMaxLph'],
  'tank.return-pump': ['includedPump', 'filtration', 'returnBoreMm'],
  'tank.support-load': [
    'dryMassKg',
    'bottomMm',
    'material',
    'shape',
    'displayLengthMm',
    'displayWidthMm',
    'chambers',
    'filtration',
    'sump',
  ],
}

const isHarmless = ({ id }: Rule, key: string) =>
  (harmless[id]?.includes(key) ?? false) || key === 'plugType' || key === 'madeFor'

/** Of all kinds; a light takes a model of the whole tank each time it is asked about. */
const anyKind = fc.oneof(
  ...kindKeys.map((kind) => ({ weight: kind === 'light' ? 1 : 8, arbitrary: pieceOf(kind, 10) })),
)

/** These judge many setups over. */
const patienceMs = 240_000

describe('what a rule reads of a piece', () => {
  it(
    'is all that it says it reads',
    () => {
      fc.assert(
        fc.property(anySetup, anyPiece, (setup, piece) => {
          const scene = sceneFor(setup, piece.kind)
          for (const rule of getRules(piece.kind).rules) {
            const restricted = keep(piece, (key) => rule.reads.includes(key))
            expect(tell(judgeIn(scene, rule, restricted)), rule.id).toEqual(tell(judgeIn(scene, rule, piece)))
          }
        }),
        { numRuns: 120 },
      )
    },
    patienceMs,
  )

  it(
    'is not passed over where it is missing',
    () => {
      fc.assert(
        fc.property(anySetup, anyCorePiece, (setup, piece) => {
          const scene = sceneFor(setup, piece.kind)
          for (const rule of getRules(piece.kind).rules)
            for (const key of rule.reads.filter((one) => !isHarmless(rule, one))) {
              const outcome = judgeIn(
                scene,
                rule,
                keep(piece, (one) => one !== key),
              )?.outcome
              // It may be that nothing turns on it here; then it must not turn into a pass by being left out.
              if (outcome === 'pass' && piece.specs[key]) expect(judgeIn(scene, rule, piece)?.outcome).toBe('pass')
            }
        }),
        { numRuns: 120 },
      )
    },
    patienceMs,
  )

  it(
    'is not passed over where it is missing, whatever the kind',
    () => {
      fc.assert(
        fc.property(anySetup, anyKind, (setup, piece) => {
          const scene = sceneFor(setup, piece.kind)
          for (const rule of getRules(piece.kind).rules)
            for (const key of rule.reads.filter((one) => piece.specs[one] && !isHarmless(rule, one))) {
              const without = keep(piece, (one) => one !== key)
              if (judgeIn(scene, rule, without)?.outcome !== 'pass') continue
              expect(judgeIn(scene, rule, piece)?.outcome, `${rule.id} without ${key}`).toBe('pass')
            }
        }),
        { numRuns: 400 },
      )
    },
    patienceMs,
  )

  it(
    'does not pass where nothing is recorded at all, unless the rule has nothing to ask',
    () => {
      fc.assert(
        fc.property(anySetup, (setup) => {
          for (const rule of listRules()) {
            const kind = rule.id.split('.')[0] as Piece['kind']
            const outcome = judgeIn(sceneFor(setup, kind), rule, { kind, specs: {} })?.outcome
            // Where the setup has a return pump already, no tank needs to say more.
            if (rule.id !== 'tank.return-pump') expect(outcome, rule.id).not.toBe('pass')
          }
        }),
        { numRuns: 40 },
      )
    },
    patienceMs,
  )

  it(
    'names what is missing among what it reads',
    () => {
      fc.assert(
        fc.property(anySetup, anyPiece, (setup, piece) => {
          const scene = sceneFor(setup, piece.kind)
          for (const rule of getRules(piece.kind).rules) {
            const judged = judgeIn(scene, rule, piece)
            if (judged?.outcome !== 'nodata') continue
            for (const key of judged.judgement.missing ?? []) expect(rule.reads, rule.id).toContain(key)
          }
        }),
        { numRuns: 120 },
      )
    },
    patienceMs,
  )
})
