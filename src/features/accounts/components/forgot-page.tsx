import { useState } from 'react'
import { SubmitForm } from '../../../components/ui/submit-form'
import { TextField } from '../../../components/ui/text-field'
import { useApp } from '../../../lib/app-context'
import { readText } from '../model/read-text'
import { DoneNote } from './done-note'
import { NarrowPage } from './narrow-page'

export function ForgotPage() {
  const { api } = useApp()
  const [isSent, setIsSent] = useState(false)
  return (
    <NarrowPage title="Ask for a new password">
      {isSent ? (
        <DoneNote>
          <p>If this address has an account, a letter is on its way. Its link works for an hour.</p>
        </DoneNote>
      ) : (
        <SubmitForm
          id="forgot"
          labels={{ email: 'E-mail address' }}
          action="Send the letter"
          onSend={async (values) => {
            await api.post('/password-resets', { email: readText(values, 'email') })
            setIsSent(true)
          }}
        >
          {(field) => <TextField {...field('email')} type="email" autoComplete="username" />}
        </SubmitForm>
      )}
    </NarrowPage>
  )
}
