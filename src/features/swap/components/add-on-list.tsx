import { Fragment } from 'react'
import { Link } from 'react-router-dom'
import type { AddOn, GearCount, Replacement } from '#shared/engine/swap/types'
import { buttonClass } from '../../../components/ui/button-class'
import { paths } from '../../../config/paths'
import type { Swap } from '../use-swap'

const nameOf = ({ gear, quantity }: GearCount): string =>
  `${quantity > 1 ? `${quantity} × ` : ''}${gear.brand} · ${gear.model}`

export interface AddOnListProps {
  readonly answer: Replacement
  readonly swap: Swap
}

function Option({ addOn, pieces, answer, swap }: AddOnListProps & { addOn: AddOn; pieces: readonly GearCount[] }) {
  const href = swap.putInHref(answer, [{ need: addOn.need, pieces }])
  return (
    <li className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1 py-1">
      <span className="min-w-0">
        {pieces.map((piece, at) => (
          <Fragment key={piece.gear.slug}>
            {at > 0 && ' and '}
            <Link to={paths.gear(piece.gear.slug)} className="link">
              {nameOf(piece)}
            </Link>
          </Fragment>
        ))}
      </span>
      {href !== null && (
        <Link
          to={href}
          aria-label={`Put both in, with ${pieces.map(nameOf).join(' and ')}`}
          className={buttonClass({ size: 'sm' })}
        >
          Put both in
        </Link>
      )}
    </li>
  )
}

/** What a candidate leaves unmet, and the pieces that meet it, the fewest first. */
export function AddOnList({ answer, swap }: AddOnListProps) {
  if (answer.addOns.length === 0) return null
  return (
    <div className="mt-3 space-y-2 border-l-[3px] border-changes pl-3 text-sm">
      {answer.addOns.map((addOn) => (
        <div key={`${addOn.need}${addOn.message}`}>
          <p className="font-semibold">{addOn.message}</p>
          {addOn.options.length === 0 ? (
            <p className="text-ink-soft">Nothing in the catalogue is known to meet it.</p>
          ) : (
            <ul>
              {addOn.options.map((pieces) => (
                <Option
                  key={pieces.map(({ gear }) => gear.slug).join(' ')}
                  addOn={addOn}
                  pieces={pieces}
                  answer={answer}
                  swap={swap}
                />
              ))}
            </ul>
          )}
        </div>
      ))}
    </div>
  )
}
