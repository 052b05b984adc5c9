import { countPlugs, findIncludedPump, findLimits, pluggedIn, sumLoad } from '../mains-budget'
import { resolve } from '../setup/resolve'
import type { Item, Setup } from '../types'
import { readNumber } from '../values'

/** One line of the ledger: what a piece takes. Null: nobody recorded it, and it counts nothing. */
export interface LedgerRow {
  readonly itemId: string
  readonly quantity: number
  readonly plugs: number | null
  readonly watts: number | null
  /** How many of its plugs sit in a temperature controller's own outlets. */
  readonly onController: number
}

export interface LedgerDrawing {
  readonly rows: readonly LedgerRow[]
  /** Items that give outlets, and how many. */
  readonly strips: readonly { readonly itemId: string; readonly outlets: number | null }[]
  readonly plugs: number
  readonly outlets: number
  readonly watts: number
  /** What may run without pause, and what strip or circuit is rated for at all. */
  readonly continuousW: number
  readonly ratedW: number
}

const times = (value: number | undefined, quantity: number) => (value === undefined ? null : value * quantity)

function listRows(items: readonly Item[]): readonly LedgerRow[] {
  let freeOnController = items
    .filter(({ piece }) => piece.kind === 'temperature-controller')
    .reduce((sum, { piece, quantity }) => sum + quantity * (readNumber(piece.specs, 'outlets') ?? 0), 0)
  return items
    .filter(({ piece }) => pluggedIn.has(piece.kind))
    .map(({ id, piece, quantity }) => {
      const plugs = times(readNumber(piece.specs, 'plugs'), quantity)
      const onController = piece.kind === 'heater' ? Math.min(plugs ?? 0, freeOnController) : 0
      freeOnController -= onController
      return { itemId: id, quantity, plugs, watts: times(readNumber(piece.specs, 'powerW'), quantity), onController }
    })
}

/** Every plug and watt of a setup against what its outlets and its circuit give. RangeError as `resolve`. */
export function drawLedger(setup: Setup): LedgerDrawing {
  const plan = resolve(setup)
  const { items } = plan
  const { used, capacity } = countPlugs(plan, items)
  const { continuousW, ratedW } = findLimits(plan, items)
  const includedPump = findIncludedPump(plan, items)
  const included: readonly LedgerRow[] = includedPump
    ? [
        {
          itemId: 'tank',
          quantity: 1,
          plugs: includedPump.plugs ?? 1,
          watts: includedPump.powerW ?? null,
          onController: 0,
        },
      ]
    : []
  return {
    rows: [...listRows(items), ...included],
    strips: items
      .filter(({ piece }) => piece.kind === 'power-strip')
      .map(({ id, piece, quantity }) => ({ itemId: id, outlets: times(readNumber(piece.specs, 'outlets'), quantity) })),
    plugs: used,
    outlets: capacity,
    watts: sumLoad(plan, items).watts,
    continuousW,
    ratedW,
  }
}
