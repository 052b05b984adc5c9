import { useState } from 'react'
import type { Me } from '#shared/schemas/accounts'
import { PasswordField } from '../../../components/ui/password-field'
import { SubmitForm } from '../../../components/ui/submit-form'
import { TextField } from '../../../components/ui/text-field'
import { useApp } from '../../../lib/app-context'
import { readText } from '../model/read-text'
import { DoneLine } from './done-line'

const labels = { email: 'New e-mail address', password: 'Present password' }

export function EmailForm({ me }: { readonly me: Me }) {
  const { api } = useApp()
  const [sentTo, setSentTo] = useState('')
  return (
    <>
      <p className="mb-4 text-sm [overflow-wrap:anywhere]">
        Letters go to {me.email}. A new address counts once you have opened the link sent there.
      </p>
      <SubmitForm
        id="email"
        labels={labels}
        action="Send the link"
        variant="plain"
        onSend={async (values) => {
          setSentTo('')
          const email = readText(values, 'email').trim()
          await api.post('/me/email', { email, password: readText(values, 'password') })
          setSentTo(email)
        }}
      >
        {(field) => (
          <>
            <TextField {...field('email')} type="email" autoComplete="email" />
            <PasswordField {...field('password')} autoComplete="current-password" />
          </>
        )}
      </SubmitForm>
      <DoneLine message={sentTo === '' ? '' : `A letter is on its way to ${sentTo}.`} />
    </>
  )
}
