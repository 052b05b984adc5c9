import { Fragment } from 'react'
import { Link } from 'react-router-dom'
import type { Answer } from '#shared/engine/types'
import { paths } from '../../config/paths'

/** What an answer is made of, each piece leading to its sheet; several where only together they answer. */
export function PieceNames({ pieces }: Pick<Answer, 'pieces'>) {
  return pieces.map(({ gear, quantity }, index) => (
    <Fragment key={gear?.slug ?? index}>
      {index > 0 && ' and '}
      {quantity > 1 && `${quantity} × `}
      {gear ? (
        <Link to={paths.gear(gear.slug)} className="decoration-1 underline-offset-4 hover:text-action hover:underline">
          {gear.brand} · {gear.model}
        </Link>
      ) : (
        'This piece'
      )}
    </Fragment>
  ))
}
