import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { practiceBasis } from '../thresholds'
import { readText } from '../values'

function judgeGroup({ others }: Scene, { piece }: Candidate): Judgement {
  const group = readText(piece.specs, 'controlGroup')
  if (group === undefined) return lacking(['controlGroup'], () => 'Nobody has recorded which lights it speaks to.')
  const lights = others.filter((item) => item.piece.kind === 'light')
  if (lights.length === 0)
    return { outcome: 'pass', measured: group, say: () => 'There is no light in the setup to hold against it.' }
  const groups = lights.map((item) => readText(item.piece.specs, 'controlGroup'))
  if (groups.includes(group))
    return { outcome: 'pass', measured: group, say: () => `Speaks to lights of the ${group} group, as yours is.` }
  if (groups.every((of) => of === undefined))
    return { outcome: 'nodata', missing: [], say: () => 'Nobody has recorded which controllers the light listens to.' }
  return {
    outcome: 'fail',
    measured: group,
    say: () => `Speaks to lights of the ${group} group, and yours is of another.`,
  }
}

export const lightControllerRules: KindRules = {
  rules: [
    {
      id: 'light-controller.group',
      label: 'Speaks to the light',
      worst: 'fail',
      unit: null,
      basis: practiceBasis,
      rule: 'Of the same control group as a light in the setup.',
      reads: ['controlGroup'],
      uses: [],
      failLabel: 'for other lights',
      judge: judgeGroup,
    },
  ],
  feltThrough: ['powerW', 'plugs', 'controlGroup'],
}
