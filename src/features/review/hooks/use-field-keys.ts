import { fieldWordsId } from '../model/decision-draft'
import type { DeskField } from '../model/list-fields'
import type { Review } from './use-review'
import type { Shortcut } from './use-shortcuts'

function findCards(): readonly HTMLElement[] {
  return [...document.querySelectorAll<HTMLElement>('[data-field-card]')]
}

function step(by: 1 | -1): void {
  const cards = findCards()
  const at = cards.findIndex((card) => card.contains(document.activeElement))
  const next = at < 0 ? (by > 0 ? 0 : cards.length - 1) : Math.min(Math.max(at + by, 0), cards.length - 1)
  cards[next]?.focus()
}

/** Keys of the proposal's page: through its values, a choice about each, and on to the decision. */
export function useFieldKeys({ proposal, fields, kept, hold }: Review): readonly Shortcut[] {
  const findField = (): DeskField | undefined => {
    const key = findCards().find((card) => card.contains(document.activeElement))?.dataset.fieldCard
    return fields.find((field) => field.key === key && field.isChoosable && field.state !== 'settled')
  }
  const choose = (choice: 'approve' | 'decline') => {
    const field = findField()
    if (!field) return
    const said = kept.draft.fields[field.key]?.words ?? ''
    kept.change({ fields: { ...kept.draft.fields, [field.key]: { choice, words: said } } })
    // The field for words is there once the choice is drawn.
    if (choice === 'decline') setTimeout(() => document.getElementById(fieldWordsId(field.key))?.focus())
  }
  const through: readonly Shortcut[] = [
    { key: 'j', label: 'next value', run: () => step(1) },
    { key: 'k', label: 'previous value', run: () => step(-1) },
  ]
  if (!proposal.can.decide) return through
  return [
    ...through,
    { key: 'a', label: 'approve this value', run: () => choose('approve') },
    { key: 'x', label: 'decline it', run: () => choose('decline') },
    {
      key: 't',
      label: proposal.lease?.isMine ? 'let go' : 'take',
      run: () => hold(proposal.lease?.isMine ? 'release' : 'take'),
    },
    {
      key: 'd',
      label: 'to the decision',
      run: () => document.querySelector<HTMLElement>('[name="course"]:checked')?.focus(),
    },
  ]
}
