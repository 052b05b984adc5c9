import type { AdminPerson, PersonChange } from '#shared/schemas/people'
import { Dialog } from '../../../components/ui/dialog'
import { SelectField } from '../../../components/ui/select-field'
import { SubmitForm } from '../../../components/ui/submit-form'
import { TextareaField } from '../../../components/ui/textarea-field'
import { useApp } from '../../../lib/app-context'
import { roleNames } from '../role-names'

export interface StandingDialogProps {
  readonly person: AdminPerson
  readonly onClose: () => void
  readonly onDone: (words: string) => void
}

const roleOptions = Object.entries(roleNames).map(([value, label]) => ({ value, label }))
const labels = { role: 'Role', suspended: 'Reason' }

/** One person's role, and whether the account is suspended. */
export function StandingDialog({ person, onClose, onDone }: StandingDialogProps) {
  const { api } = useApp()
  const { name, role, suspended } = person
  const change = async (body: PersonChange, words: string) => {
    await api.patch(`/admin/people/${encodeURIComponent(name)}`, body)
    onDone(words)
  }
  return (
    <Dialog title={name} onClose={onClose}>
      <div className="space-y-8">
        <SubmitForm
          id="role"
          labels={labels}
          action="Give this role"
          onSend={(values) => {
            const wanted = values.get('role') as AdminPerson['role']
            return change({ role: wanted }, `${name} is ${roleNames[wanted].toLowerCase()} now.`)
          }}
        >
          {(field) => <SelectField {...field('role')} options={roleOptions} defaultValue={role} />}
        </SubmitForm>
        {suspended ? (
          <SubmitForm
            id="lift"
            labels={labels}
            action="Lift the suspension"
            variant="plain"
            onSend={() => change({ suspended: null }, `${name} may come in again.`)}
          >
            {() => <p>Suspended: {suspended.reason}</p>}
          </SubmitForm>
        ) : (
          <SubmitForm
            id="suspend"
            labels={labels}
            action="Suspend the account"
            variant="plain"
            onSend={(values) => {
              const reason = values.get('suspended')
              return change(
                { suspended: { reason: typeof reason === 'string' ? reason : '' } },
                `${name} is suspended, and signed out everywhere.`,
              )
            }}
          >
            {(field) => (
              <TextareaField {...field('suspended')} hint="The person is told it, and it is kept in the audit trail." />
            )}
          </SubmitForm>
        )}
      </div>
    </Dialog>
  )
}
