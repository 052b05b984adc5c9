import { Link } from 'react-router-dom'
import type { AuditEventItem } from '#shared/schemas/admin'
import { paths } from '../../../config/paths'
import { printMoment } from '../print-moment'

const hasDetail = (detail: AuditEventItem['detail']) => Object.keys(detail).length > 0

export function AuditEvent({ event }: { readonly event: AuditEventItem }) {
  const { at, actor, action, subject, detail, requestId } = event
  return (
    <li className="grid gap-x-4 gap-y-1 border-t border-rule py-3 md:grid-cols-[11rem_minmax(0,1fr)]">
      <time dateTime={at} className="font-mono text-sm text-ink-soft">
        {printMoment(at)}
      </time>
      <div className="min-w-0">
        <p>
          <strong>{actor ?? 'system'}</strong> <span className="font-mono text-sm">{action}</span>
        </p>
        <p className="text-sm break-words text-ink-soft">
          <Link
            to={`${paths.adminAudit}?${new URLSearchParams({ subject: `${subject.type}:${subject.id}` }).toString()}`}
            className="link"
          >
            {subject.type} {subject.id}
          </Link>
          {requestId !== null && <span className="font-mono text-xs"> · request {requestId}</span>}
        </p>
        {hasDetail(detail) && (
          <pre
            tabIndex={0}
            aria-label={`Detail of ${action}`}
            className="mt-1 max-h-48 overflow-auto bg-sheet p-2 font-mono text-xs"
          >
            {JSON.stringify(detail, null, 2)}
          </pre>
        )}
      </div>
    </li>
  )
}
