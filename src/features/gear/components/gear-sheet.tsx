import { useState } from 'react'
import { useQuery } from '@tanstack/react-query'
import { Link } from 'react-router-dom'
import { getKind, isKindKey } from '#shared/kinds/index'
import type { Attribute } from '#shared/kinds/types'
import type { Gear } from '#shared/schemas/gear'
import { Button } from '../../../components/ui/button'
import { buttonClass } from '../../../components/ui/button-class'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { describeSpecs } from '../../../lib/describe-specs'
import { usePrinter } from '../../../lib/use-printer'
import { revisionsQuery } from '../api/get-revisions'
import { CheckLinks } from './check-links'
import { GearDrawing } from './gear-drawing'
import { KindCautions } from './kind-cautions'
import { MissingNumbers } from './missing-numbers'
import { ReportDialog } from './report-dialog'
import { RevisionList } from './revision-list'
import { SpecList } from './spec-list'

const statusWords = {
  current: 'In production',
  discontinued: 'Discontinued: its maker no longer makes it',
  unknown: 'Not known whether it is still made',
} as const

/** Everything recorded of one piece. */
export function GearSheet({ gear }: { readonly gear: Gear }) {
  const { api } = useApp()
  const printer = usePrinter()
  const revisions = useQuery(revisionsQuery(api, gear.slug)).data?.items ?? []
  const [report, setReport] = useState<{ readonly attribute: Attribute | null } | null>(null)
  const kind = isKindKey(gear.kind) ? gear.kind : null
  if (!kind) return <h1>{gear.model}</h1>
  const { attributes, plural } = getKind(kind)
  return (
    <>
      <p className="text-sm text-ink-soft">
        <Link to={`${paths.gearList}?kind=${kind}`} className="link">
          {plural}
        </Link>{' '}
        · revision {gear.revision} ·{' '}
        <Link to={paths.gearHistory(gear.slug)} className="link">
          history
        </Link>
      </p>
      <h1 className="mt-1">
        {gear.brand} · {gear.model}
      </h1>
      <p className="mt-2 max-w-prose text-lg">{describeSpecs(kind, gear.specs, printer)}</p>
      <p className={gear.status === 'discontinued' ? 'mt-1 font-semibold text-changes' : 'mt-1 text-ink-soft'}>
        {statusWords[gear.status]}
        {gear.gtin !== null && <span className="font-mono text-sm"> · GTIN {gear.gtin}</span>}
      </p>
      <CheckLinks gear={gear} />
      <div className="mt-8 max-w-4xl">
        <GearDrawing gear={gear} printer={printer} />
      </div>
      {(['check', 'difference', 'display'] as const).map((role) => (
        <SpecList
          key={role}
          role={role}
          attributes={attributes}
          gear={gear}
          printer={printer}
          onReport={(attribute) => setReport({ attribute })}
        />
      ))}
      <MissingNumbers gear={gear} attributes={attributes} />
      <p className="mt-8 flex flex-wrap items-center gap-3 print:hidden">
        <Link to={paths.gearEdit(gear.slug)} className={buttonClass()}>
          Correct or complete it
        </Link>
        <Button variant="quiet" onClick={() => setReport({ attribute: null })}>
          Something wrong here?
        </Button>
      </p>
      {report && <ReportDialog slug={gear.slug} attribute={report.attribute} onClose={() => setReport(null)} />}
      {gear.notes !== null && (
        <section className="mt-8">
          <h2>Notes</h2>
          {/* Sanitised where it is written: only plain text markup is ever stored. */}
          <div className="mt-2 max-w-prose space-y-2" dangerouslySetInnerHTML={{ __html: gear.notes }} />
        </section>
      )}
      {revisions.length > 0 && <RevisionList kind={kind} revisions={revisions} slug={gear.slug} />}
      <KindCautions kind={kind} />
    </>
  )
}
