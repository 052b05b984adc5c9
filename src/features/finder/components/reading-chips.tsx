import { useMemo } from 'react'
import { useQuery } from '@tanstack/react-query'
import { Link } from 'react-router-dom'
import { readQuestion } from '#shared/engine/ask/read-question'
import { kinds } from '#shared/kinds/index'
import type { AskAnswer } from '#shared/schemas/ask'
import { EditLink } from '../../../components/setup/edit-link'
import type { RawSetup } from '../../../components/setup/edit-raw'
import { addItem } from '../../../components/setup/items-raw'
import { writeSetupHref } from '../../../components/setup/setup-href'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { readingQuery } from '../api/ask'
import type { Finder } from '../hooks/use-finder'
import { fieldId } from '../../../components/setup/field-groups'

export interface ReadingChipsProps {
  readonly finder: Finder
  readonly onEdit: (path: string, target: Element) => void
}

/** Where the replacements of a named piece are, in the setup that is drawn. */
function writeSwapHref({ gear, kind }: AskAnswer, { state, printer }: Finder): string | null {
  if (!gear || kind === null) return null
  const { raw, id } = addItem(state.raw, kind, gear.slug)
  const gone: RawSetup = id === 'tank' ? raw : { ...raw, [`items.${id}.state`]: 'gone' }
  return writeSetupHref(paths.swap(id), gone, printer.system)
}

/** What was understood of the question, piece by piece and correctable, and what was left over. */
export function ReadingChips({ finder, onEdit }: ReadingChipsProps) {
  const { state, printer } = finder
  const { api } = useApp()
  const isAsked = state.asked !== ''
  const question = useMemo(() => readQuestion(state.asked, printer.system), [state.asked, printer.system])
  // The server knows the names of the catalogue, and tells a piece's from words that are not used.
  const named = useQuery({ ...readingQuery(api, state.asked, printer.system), enabled: isAsked }).data
  if (!isAsked) return null
  const { understood, ignored } = named ?? question
  const gone = named?.gear ? writeSwapHref(named, finder) : null
  const isOtherKind = question.kind !== null && question.kind !== state.kind
  // A chamber is one thing in a question, whichever of its sizes comes first.
  const groupOf = (path: string) => (/^tank\.chambers\.\d+\./.test(path) ? path.split('.').slice(0, 3).join('.') : path)
  return (
    <div className="mt-3 text-sm">
      <ul className="flex flex-wrap items-center gap-x-4 gap-y-1" aria-label="We read">
        <li aria-hidden="true" className="text-ink-soft">
          We read
        </li>
        {understood.map(({ text, meaning, path, start }) => {
          const isChanged =
            path === undefined
              ? isOtherKind && meaning.endsWith(kinds[question.kind ?? state.kind].label)
              : state.raw[path] !== question.fields[path]?.text
          const look = isChanged ? 'text-ink-soft line-through' : 'given'
          return (
            <li key={start}>
              {path === undefined ? (
                <span className={`inline-flex min-h-7 items-center ${look}`} title={`from “${text}”`}>
                  {meaning}
                </span>
              ) : (
                <EditLink
                  href={`#${fieldId(path)}`}
                  title={`from “${text}”`}
                  onEdit={(anchor) => onEdit(groupOf(path), anchor)}
                  className={`inline-flex min-h-7 items-center hover:text-action ${look}`}
                >
                  {meaning}
                  {isChanged && <span className="sr-only">, changed since</span>}
                </EditLink>
              )}
            </li>
          )
        })}
        {understood.length === 0 && <li>nothing that a setup or a piece of gear could be made of</li>}
        <li className="text-ink-soft">
          {ignored.length === 0 ? 'nothing left over' : `not used: ${ignored.map((word) => `“${word}”`).join(', ')}`}
        </li>
      </ul>
      {question.intent === 'missing' && (
        <p className="mt-1 text-ink-soft">
          What a whole setup lacks is told by{' '}
          <Link to={writeSetupHref(paths.setup, state.raw, printer.system)} className="link">
            the report on it
          </Link>
          .
        </p>
      )}
      {question.intent === 'replace' && (
        <p className="mt-1 text-ink-soft">
          Every answer below could take the place of the piece that is gone, in the setup that is drawn.
          {gone !== null && (
            <>
              {' '}
              What else would change with each is on{' '}
              <Link to={gone} className="link">
                the page of its replacements
              </Link>
              .
            </>
          )}
        </p>
      )}
    </div>
  )
}
