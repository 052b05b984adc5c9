import { listItems } from '../../../components/setup/items-raw'
import type { SetupReport } from '../hooks/use-setup-report'

/** What is yet to be bought: planned pieces, and what is missing altogether. Meant for paper as much as for the screen. */
export function ShoppingList({ shown }: { readonly shown: SetupReport }) {
  const { report, visit, nameOf } = shown
  const planned = listItems(visit.raw).filter(({ state }) => state === 'planned')
  const asked = report.needs.filter(({ metBy, neededBy }) => metBy.length === 0 && !neededBy.includes('setup'))
  const lines = [
    ...planned.map(({ id, quantity }) => ({ key: id, text: `${quantity} × ${nameOf(id)}` })),
    ...report.missing.map(({ need, message }) => ({ key: need, text: message })),
    ...asked.map(({ need, neededBy, message }) => ({
      key: `${need} ${neededBy.join(' ')}`,
      text: `For ${neededBy.map(nameOf).join(', ')}: ${message}`,
    })),
  ]
  if (lines.length === 0) return <p>Nothing is left to buy.</p>
  return (
    <ul className="max-w-3xl">
      {lines.map(({ key, text }) => (
        <li key={key} className="flex gap-3 border-b border-rule py-2">
          <svg width="16" height="16" aria-hidden="true" className="mt-1 flex-none">
            <rect x="1" y="1" width="14" height="14" fill="none" strokeWidth="1.5" className="stroke-ink" />
          </svg>
          <span className="min-w-0">{text}</span>
        </li>
      ))}
    </ul>
  )
}
