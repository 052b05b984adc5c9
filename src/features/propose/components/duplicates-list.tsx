import { keepPreviousData, useQuery } from '@tanstack/react-query'
import { useEffect, useState } from 'react'
import { Link } from 'react-router-dom'
import { LiveStatus } from '../../../components/ui/live-status'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { duplicatesQuery, type DuplicatesAsked } from '../api/duplicates-query'

const restMs = 400
const matchWords = { gtin: 'the same barcode number', name: 'the same name', alike: 'a name like it' } as const

function useRestedAsked(asked: DuplicatesAsked): DuplicatesAsked {
  const [rested, setRested] = useState(asked)
  const { kind, brand, model, gtin } = asked
  useEffect(() => {
    const timer = setTimeout(() => setRested({ kind, brand, model, gtin }), restMs)
    return () => clearTimeout(timer)
  }, [kind, brand, model, gtin])
  return rested
}

/** Pieces on record that may be this one already, before it is added a second time. */
export function DuplicatesList({ kind, brand, model, gtin }: DuplicatesAsked) {
  const { api } = useApp()
  const isCode = /^\d{8,14}$/.test(gtin)
  const asked = useRestedAsked({ kind, brand: brand.trim(), model: model.trim(), gtin: isCode ? gtin : '' })
  const canAsk = asked.model.length > 1 || asked.gtin !== ''
  const { data } = useQuery({ ...duplicatesQuery(api, asked), enabled: canAsk, placeholderData: keepPreviousData })
  const found = canAsk ? (data?.items ?? []) : []
  const count =
    found.length === 1 ? '1 piece on record may be this one' : `${found.length} pieces on record may be this one`
  return (
    <>
      <LiveStatus message={found.length > 0 ? `${count}.` : ''} />
      {found.length > 0 && (
        <section
          aria-label="Likely duplicates"
          className="mt-5 border border-l-[5px] border-changes bg-sheet px-4 py-3"
        >
          <h3 className="font-semibold">{count}</h3>
          <p className="text-sm text-ink-soft">
            If one of them is, correct that one instead: its history stays in one place.
          </p>
          <ul className="mt-2 space-y-1">
            {found.map((piece) => (
              <li key={piece.slug} className="flex flex-wrap items-baseline gap-x-3">
                <Link to={paths.gear(piece.slug)} className="link">
                  {piece.brand} {piece.model}
                </Link>
                <span className="text-sm text-ink-soft">{matchWords[piece.match]}</span>
                <Link
                  to={paths.gearEdit(piece.slug)}
                  className="link text-sm"
                  aria-label={`Correct ${piece.brand} ${piece.model}`}
                >
                  correct it
                </Link>
              </li>
            ))}
          </ul>
        </section>
      )}
    </>
  )
}
