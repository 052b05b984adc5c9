import { useState } from 'react'
import { Link, useSearchParams } from 'react-router-dom'
import { buttonClass } from '../../../components/ui/button-class'
import { PasswordField } from '../../../components/ui/password-field'
import { SubmitForm } from '../../../components/ui/submit-form'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { readText } from '../model/read-text'
import { DoneNote } from './done-note'
import { NarrowPage } from './narrow-page'
import { passwordHint } from './password-hint'

const labels = { password: 'New password', token: 'The link' }

export function ResetPage() {
  const { api } = useApp()
  const [search] = useSearchParams()
  const [isSet, setIsSet] = useState(false)
  return (
    <NarrowPage title="Choose a new password">
      {isSet ? (
        <DoneNote>
          <p>Your new password is set, and every session has ended.</p>
          <p>
            <Link to={paths.signIn('/')} className={buttonClass({ variant: 'primary' })}>
              Sign in
            </Link>
          </p>
        </DoneNote>
      ) : (
        <>
          <SubmitForm
            id="reset"
            labels={labels}
            action="Set the password"
            onSend={async (values) => {
              const token = search.get('token') ?? ''
              await api.post('/password-resets/confirm', { token, password: readText(values, 'password') })
              setIsSet(true)
            }}
          >
            {(field) => <PasswordField {...field('password')} hint={passwordHint} autoComplete="new-password" />}
          </SubmitForm>
          <p className="mt-6">
            <Link to={paths.forgot} className="link inline-block min-h-6">
              Ask for another letter
            </Link>
          </p>
        </>
      )}
    </NarrowPage>
  )
}
