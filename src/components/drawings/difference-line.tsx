import type { Difference } from '#shared/engine/swap/types'
import { fitDomain, percent, placePercent } from './scale-domain'

const looks = {
  better: { fill: 'fill-fits', stroke: 'stroke-fits' },
  worse: { fill: 'fill-changes', stroke: 'stroke-changes' },
  different: { fill: 'fill-ink', stroke: 'stroke-ink' },
} as const

/** From what was (hollow) to what would be (solid), on one line. The words beside it say the same. */
export function DifferenceLine({ from, to, sense }: Pick<Difference, 'sense'> & { from: number; to: number }) {
  const domain = fitDomain([from, to, Math.min(from, to) * 0.8], 0.1)
  const [a, b] = [placePercent(from, domain), placePercent(to, domain)]
  const { fill, stroke } = looks[sense]
  return (
    <svg width="100%" height="16" overflow="visible" aria-hidden="true" className="block">
      <line x1="0" x2="100%" y1="8" y2="8" strokeWidth="1" className="stroke-rule" />
      <line x1={percent(a)} x2={percent(b)} y1="8" y2="8" strokeWidth="3" className={stroke} />
      <circle cx={percent(a)} cy="8" r="4.5" strokeWidth="1.5" className="fill-sheet stroke-ink-soft" />
      <circle cx={percent(b)} cy="8" r="5" className={fill} />
    </svg>
  )
}
