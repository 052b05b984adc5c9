import type { GearItem } from '#shared/schemas/gear'
import type { WordDifference } from '../model/compare-pieces'
import { unknownText } from '../../../lib/describe-filter'
import { PieceLetter } from './piece-letter'

export interface DifferenceWordsProps {
  readonly difference: WordDifference
  readonly pieces: readonly GearItem[]
}

export function DifferenceWords({ difference: { attribute, words }, pieces }: DifferenceWordsProps) {
  return (
    <div className="min-w-0">
      <h4 className="text-sm font-semibold first-letter:uppercase">{attribute.label}</h4>
      <ul className="mt-1 space-y-1 text-sm">
        {pieces.map((piece, at) => {
          const text = words[at] ?? null
          return (
            <li key={piece.slug} className="flex items-baseline gap-2.5">
              <PieceLetter at={at} />
              {text === null ? (
                <span className="text-ink-soft">{unknownText}</span>
              ) : (
                <span className="min-w-0 break-words">{text}</span>
              )}
            </li>
          )
        })}
      </ul>
    </div>
  )
}
