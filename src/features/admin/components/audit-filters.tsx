import { Form, Link } from 'react-router-dom'
import { Button } from '../../../components/ui/button'
import { buttonClass } from '../../../components/ui/button-class'
import { TextField } from '../../../components/ui/text-field'
import { paths } from '../../../config/paths'
import type { AuditFilters } from '../api/audit-query'

const fields = [
  { key: 'actor', label: 'Who', hint: 'a name, or "system"' },
  { key: 'action', label: 'What', hint: 'such as proposal.approve' },
  { key: 'subject', label: 'About what', hint: 'such as gear or evidence' },
  { key: 'from', label: 'From', hint: 'such as 2026-05-01' },
  { key: 'to', label: 'To', hint: 'that day included' },
] as const

export interface AuditFilterFormProps {
  readonly filters: AuditFilters
  /** By the field's key. */
  readonly errors: Readonly<Record<string, string>>
}

/** A plain form whose answer is an address: it can be shared, kept, and used without scripts. */
export function AuditFilterForm({ filters, errors }: AuditFilterFormProps) {
  return (
    <Form method="get" role="search" aria-label="Audit trail" className="grid gap-4 sm:grid-cols-2 lg:grid-cols-5">
      {fields.map(({ key, label, hint }) => (
        <TextField
          key={key}
          id={`audit-${key}`}
          name={key}
          label={label}
          hint={hint}
          error={errors[key]}
          defaultValue={filters[key] ?? ''}
          autoComplete="off"
        />
      ))}
      <div className="flex flex-wrap items-center gap-3 sm:col-span-full">
        <Button type="submit" variant="primary">
          Search the trail
        </Button>
        <Link to={paths.adminAudit} className={buttonClass({ variant: 'quiet' })}>
          Show everything
        </Link>
      </div>
    </Form>
  )
}
