import { Link, useSearchParams } from 'react-router-dom'
import { PasswordField } from '../../../components/ui/password-field'
import { SubmitForm } from '../../../components/ui/submit-form'
import { TextField } from '../../../components/ui/text-field'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { useSessionChange } from '../api/use-session-change'
import { readNext } from '../model/read-next'
import { readText } from '../model/read-text'
import { NarrowPage } from './narrow-page'

const labels = { email: 'E-mail address', password: 'Password' }

export function SignInPage() {
  const { api } = useApp()
  const [search] = useSearchParams()
  const goOn = useSessionChange()
  const next = readNext(search.get('next'))
  return (
    <NarrowPage title="Sign in" intro={<p>Looking things up needs no account. Contributing does.</p>}>
      <SubmitForm
        id="sign-in"
        labels={labels}
        action="Sign in"
        onSend={async (values) => {
          await api.post('/session', { email: readText(values, 'email'), password: readText(values, 'password') })
          await goOn(next)
        }}
      >
        {(field) => (
          <>
            <TextField {...field('email')} type="email" autoComplete="username" />
            <PasswordField {...field('password')} autoComplete="current-password" />
          </>
        )}
      </SubmitForm>
      <ul className="mt-6 space-y-1">
        <li>
          <Link to={paths.forgot} className="link inline-block min-h-6">
            Ask for a new password
          </Link>
        </li>
        <li>
          <Link to={paths.signUp} className="link inline-block min-h-6">
            Sign up
          </Link>
        </li>
      </ul>
    </NarrowPage>
  )
}
