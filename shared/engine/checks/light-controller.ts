import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { practiceBasis } from '../thresholds'
import { readText } from '../values'

/** How lights are set that no controller speaks to. */
const alone: ReadonlySet<string | undefined> = new Set(['on-unit', 'on-off', 'app-built-in'])

function judgeGroup({ others }: Scene, { piece }: Candidate): Judgement {
  const group = readText(piece.specs, 'controlGroup')
  if (group === undefined) return lacking(['controlGroup'], () => 'Nobody has recorded which lights it speaks to.')
  const lights = others.filter((item) => item.piece.kind === 'light').map((item) => item.piece.specs)
  if (lights.length === 0)
    return { outcome: 'nodata', missing: [], say: () => 'There is no light in the setup to hold it against.' }
  const groups = lights.map((specs) => readText(specs, 'controlGroup'))
  if (groups.includes(group))
    return { outcome: 'pass', measured: group, say: () => `Speaks to lights of the ${group} group, as yours is.` }
  const isUnknown = lights.some((specs, index) => groups[index] === undefined && !alone.has(readText(specs, 'control')))
  if (isUnknown)
    return { outcome: 'nodata', missing: [], say: () => 'Nobody has recorded which controllers the light listens to.' }
  return {
    outcome: 'fail',
    measured: group,
    say: () =>
      groups.every((of) => of === undefined)
        ? `Speaks to lights of the ${group} group, and yours takes no controller.`
        : `Speaks to lights of the ${group} group, and yours is of another.`,
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
