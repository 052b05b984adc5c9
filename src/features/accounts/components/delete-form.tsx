import { PasswordField } from '../../../components/ui/password-field'
import { SubmitForm } from '../../../components/ui/submit-form'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { useSessionChange } from '../api/use-session-change'
import { readText } from '../model/read-text'

export function DeleteForm() {
  const { api } = useApp()
  const goOn = useSessionChange()
  return (
    <>
      <p className="mb-4 text-sm">
        Your name, address and password are taken out for good. What you contributed stays in the record, under “a
        former member”. This cannot be undone.
      </p>
      <SubmitForm
        id="delete"
        labels={{ password: 'Present password' }}
        action="Delete my account"
        variant="plain"
        onSend={async (values) => {
          await api.delete('/me', { password: readText(values, 'password') })
          await goOn(paths.home)
        }}
      >
        {(field) => <PasswordField {...field('password')} autoComplete="current-password" />}
      </SubmitForm>
    </>
  )
}
