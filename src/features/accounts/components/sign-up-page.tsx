import { useState } from 'react'
import { Link } from 'react-router-dom'
import { PasswordField } from '../../../components/ui/password-field'
import { SubmitForm } from '../../../components/ui/submit-form'
import { TextField } from '../../../components/ui/text-field'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { readText } from '../model/read-text'
import { DoneNote } from './done-note'
import { NarrowPage } from './narrow-page'
import { passwordHint } from './password-hint'

const labels = { name: 'Name', email: 'E-mail address', password: 'Password' }

export function SignUpPage() {
  const { api } = useApp()
  const [sentTo, setSentTo] = useState<string | null>(null)
  if (sentTo !== null) {
    return (
      <NarrowPage title="Look into your letters">
        <DoneNote>
          <p>
            A letter is on its way to <strong className="[overflow-wrap:anywhere]">{sentTo}</strong>. Open the link in
            it within two days, then sign in.
          </p>
          <p>Nothing there after some minutes? Look among the unwanted letters, or sign up again.</p>
        </DoneNote>
      </NarrowPage>
    )
  }
  return (
    <NarrowPage
      title="Sign up"
      intro={
        <>
          <p>With an account you can add gear, correct numbers, and say that you measured the same.</p>
          <p>Your name is public, your address is not. Facts that you contribute become open data.</p>
        </>
      }
    >
      <SubmitForm
        id="sign-up"
        labels={labels}
        action="Sign up"
        onSend={async (values) => {
          const email = readText(values, 'email').trim()
          await api.post('/people', { name: readText(values, 'name'), email, password: readText(values, 'password') })
          setSentTo(email)
        }}
      >
        {(field) => (
          <>
            <TextField
              {...field('name')}
              hint="Public; it need not be your real one."
              autoComplete="nickname"
              maxLength={40}
            />
            <TextField
              {...field('email')}
              hint="For letters about your account and your contributions."
              type="email"
              autoComplete="username"
            />
            <PasswordField {...field('password')} hint={passwordHint} autoComplete="new-password" />
          </>
        )}
      </SubmitForm>
      <p className="mt-6">
        <Link to={paths.signIn('/')} className="link inline-block min-h-6">
          Sign in instead
        </Link>
      </p>
    </NarrowPage>
  )
}
