import { useState } from 'react'
import { PasswordField } from '../../../components/ui/password-field'
import { SubmitForm } from '../../../components/ui/submit-form'
import { useApp } from '../../../lib/app-context'
import { ownSessionsQuery } from '../api/account-queries'
import { readText } from '../model/read-text'
import { DoneLine } from './done-line'
import { passwordHint } from './password-hint'

const labels = { password: 'Present password', newPassword: 'New password' }

export function PasswordForm() {
  const { api, queryClient } = useApp()
  const [changes, setChanges] = useState(0)
  return (
    <>
      <SubmitForm
        key={changes}
        id="password"
        labels={labels}
        action="Change the password"
        variant="plain"
        onSend={async (values) => {
          const change = { password: readText(values, 'password'), newPassword: readText(values, 'newPassword') }
          await api.post('/me/password', { ...change, endOthers: values.has('endOthers') })
          await queryClient.invalidateQueries({ queryKey: ownSessionsQuery(api).queryKey })
          setChanges(changes + 1)
        }}
      >
        {(field) => (
          <>
            <PasswordField {...field('password')} autoComplete="current-password" />
            <PasswordField {...field('newPassword')} hint={passwordHint} autoComplete="new-password" />
            <label className="flex min-h-11 items-center gap-3">
              <input type="checkbox" name="endOthers" defaultChecked className="size-5" />
              Sign out everywhere else
            </label>
          </>
        )}
      </SubmitForm>
      <DoneLine message={changes === 0 ? '' : 'Your password is changed.'} />
    </>
  )
}
