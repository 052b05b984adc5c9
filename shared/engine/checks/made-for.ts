import type { KindKey } from '../../kinds/index'
import type { Candidate, Judgement, Rule } from '../rule'
import type { Scene } from '../scene'
import { practiceBasis } from '../thresholds'
import { readSet } from '../values'

const labels: Readonly<Record<string, string>> = {
  reef: 'reef',
  'marine-fish': 'marine fish',
  freshwater: 'freshwater',
  plants: 'planted',
}

/** Condemns only what its maker makes for something else; silence condemns nothing. */
function judgeMadeFor(_scene: Scene, { piece }: Candidate): Judgement | null {
  const uses = readSet<string>(piece.specs, 'madeFor')
  if (uses === undefined || uses.length === 0) return null
  const isMarine = uses.includes('reef') || uses.includes('marine-fish')
  return {
    outcome: isMarine ? 'pass' : 'fail',
    measured: uses,
    say: () =>
      isMarine
        ? 'Made for salt water.'
        : `Made for ${uses.map((use) => labels[use] ?? use).join(' and ')} tanks, not for salt water.`,
  }
}

export const createMadeForRule = (kind: KindKey): Rule => ({
  id: `${kind}.made-for`,
  label: 'Made for',
  worst: 'fail',
  unit: null,
  basis: practiceBasis,
  rule: 'Fails where its maker states a use and neither reef nor marine fish is among it. Where nothing is stated, nothing is judged.',
  reads: ['madeFor'],
  uses: [],
  failLabel: 'not made for salt water',
  judge: judgeMadeFor,
})
