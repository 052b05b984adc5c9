import { useState, type ClipboardEvent } from 'react'
import { identityAttributes } from '#shared/kinds/common'
import { getKind } from '#shared/kinds/index'
import type { KindKey } from '#shared/kinds/index'
import type { UnitSystem } from '#shared/units/systems'
import { Button } from '../../../components/ui/button'
import { Disclosure } from '../../../components/ui/disclosure'
import { controlClass, FieldShell } from '../../../components/ui/field'
import { LiveStatus } from '../../../components/ui/live-status'
import { capitalise } from '../../../lib/capitalise'
import { readPasted, type Mapping, type PasteReading } from '../paste/read-pasted'
import { stripHtml } from '../paste/strip-html'

export interface PasteBoxProps {
  readonly kind: KindKey
  readonly system: UnitSystem
  readonly onTake: (mapped: readonly Mapping[]) => void
}

const skip = ''

const listTargets = (kind: KindKey) =>
  [...identityAttributes.filter(({ key }) => key !== 'notes'), ...getKind(kind).attributes].flatMap((attribute) =>
    attribute.type === 'group' ? [] : [{ value: attribute.key, label: capitalise(attribute.label) }],
  )

function MappingRow({
  mapping,
  at,
  kind,
  onChange,
}: {
  readonly mapping: Mapping
  readonly at: number
  readonly kind: KindKey
  readonly onChange: (next: Mapping) => void
}) {
  return (
    <tr className="border-t border-rule align-top">
      <td className="py-2 pr-4 break-words">{mapping.line}</td>
      <td className="py-2 pr-4">
        <select
          aria-label={`Field for “${mapping.line}”`}
          className={`${controlClass} min-w-44`}
          value={mapping.key}
          onChange={(event) => onChange({ ...mapping, key: event.target.value })}
        >
          <option value={skip}>leave it out</option>
          {listTargets(kind).map(({ value, label }) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </select>
      </td>
      <td className="py-2">
        <input
          aria-label={`Value of line ${at + 1}`}
          className={`${controlClass} min-w-32 font-mono`}
          value={mapping.text}
          onChange={(event) => onChange({ ...mapping, text: event.target.value })}
        />
      </td>
    </tr>
  )
}

/** Pasted tables arrive as markup too, which keeps the cells apart. */
function readClipboard(event: ClipboardEvent<HTMLTextAreaElement>): string | null {
  const html = event.clipboardData.getData('text/html')
  return /<(table|dl|ul|ol)\b/i.test(html) ? stripHtml(html).trim() : null
}

/** A whole table of specs at once: read, shown, put right, and only then taken into the form. */
export function PasteBox({ kind, system, onTake }: PasteBoxProps) {
  const [text, setText] = useState('')
  const [reading, setReading] = useState<PasteReading | null>(null)
  const [taken, setTaken] = useState('')
  const mapped = reading?.mapped ?? []
  const kept = mapped.filter(({ key }) => key !== skip)
  const change = (at: number, next: Mapping) =>
    setReading((now) => now && { ...now, mapped: now.mapped.map((one, each) => (each === at ? next : one)) })
  const take = () => {
    onTake(kept)
    setTaken(`${kept.length} ${kept.length === 1 ? 'value' : 'values'} taken into the form below.`)
    setReading(null)
    setText('')
  }
  return (
    <Disclosure summary="Paste a table of specs">
      <FieldShell
        id="pasted"
        label="Table or list"
        hint="From a maker’s sheet or page: cells, “Length: 12 in” lines, or markup. You look at how it is read first."
      >
        <textarea
          id="pasted"
          rows={5}
          value={text}
          aria-describedby="pasted-hint"
          className={`${controlClass} py-2 font-mono text-sm`}
          onPaste={(event) => {
            const cells = readClipboard(event)
            if (cells === null) return
            event.preventDefault()
            setText((now) => (now.trim() === '' ? cells : `${now}\n${cells}`))
          }}
          onChange={(event) => setText(event.target.value)}
        />
      </FieldShell>
      <Button className="mt-2" onClick={() => setReading(readPasted(text, kind, system))}>
        Read it
      </Button>
      <LiveStatus message={reading ? `${mapped.length} lines understood, ${reading.unread.length} not.` : taken} />
      {taken !== '' && !reading && <p className="mt-3 font-semibold">{taken}</p>}
      {reading && mapped.length === 0 && (
        <p className="mt-3 font-semibold">Nothing of it could be read as a value of a {getKind(kind).label}.</p>
      )}
      {mapped.length > 0 && (
        <>
          <div className="mt-4 overflow-x-auto" tabIndex={0} role="region" aria-label="How it is read">
            <table className="w-full min-w-[34rem] text-sm">
              <caption className="text-left font-semibold">How it is read</caption>
              <thead>
                <tr className="text-left text-ink-soft">
                  <th scope="col" className="py-1 font-normal">
                    Line
                  </th>
                  <th scope="col" className="py-1 font-normal">
                    Field
                  </th>
                  <th scope="col" className="py-1 font-normal">
                    Value
                  </th>
                </tr>
              </thead>
              <tbody>
                {mapped.map((mapping, at) => (
                  <MappingRow key={at} at={at} mapping={mapping} kind={kind} onChange={(next) => change(at, next)} />
                ))}
              </tbody>
            </table>
          </div>
          <Button variant="primary" className="mt-3" onClick={take}>
            Take {kept.length} {kept.length === 1 ? 'value' : 'values'} into the form
          </Button>
        </>
      )}
      {reading && reading.unread.length > 0 && (
        <section className="mt-4" aria-label="Not understood">
          <h3 className="text-sm font-semibold">Not understood, and left out</h3>
          <ul className="mt-1 list-disc pl-5 font-mono text-sm text-ink-soft">
            {reading.unread.map((line, at) => (
              <li key={at} className="break-words">
                {line}
              </li>
            ))}
          </ul>
        </section>
      )}
    </Disclosure>
  )
}
