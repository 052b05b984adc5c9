import { useSuspenseQuery } from '@tanstack/react-query'
import { Link } from 'react-router-dom'
import { Button } from '../../../components/ui/button'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { useSignedIn } from '../../../lib/session'
import { meQuery } from '../api/account-queries'
import { useSessionChange } from '../api/use-session-change'
import { AccountPart } from './account-part'
import { DeleteForm } from './delete-form'
import { DetailsForm } from './details-form'
import { EmailForm } from './email-form'
import { PasswordForm } from './password-form'
import { SessionList } from './session-list'

export function AccountPage() {
  const { api } = useApp()
  const person = useSignedIn()
  const { data: me } = useSuspenseQuery(meQuery(api))
  const goOn = useSessionChange()
  const ways = [
    { href: paths.person(me.name), label: 'Your public page' },
    { href: paths.proposals, label: 'Your proposals' },
    ...(person?.can.review ? [{ href: paths.review, label: 'Review desk' }] : []),
    ...(person?.can.administer ? [{ href: paths.admin, label: 'People and roles' }] : []),
  ]
  return (
    <>
      <div className="flex flex-wrap items-end justify-between gap-4">
        <div className="min-w-0">
          <h1 className="[overflow-wrap:anywhere]">{me.name}</h1>
          <p className="mt-1 text-ink-soft">
            Signed in as {me.role}, {me.email}
          </p>
        </div>
        <Button
          onClick={() => {
            void api.delete('/session').then(() => goOn(paths.home))
          }}
        >
          Sign out
        </Button>
      </div>
      <ul className="mt-4 flex flex-wrap gap-x-6 gap-y-1">
        {ways.map(({ href, label }) => (
          <li key={href}>
            <Link to={href} className="link inline-block min-h-6">
              {label}
            </Link>
          </li>
        ))}
      </ul>
      <div className="mt-8 grid gap-x-12 gap-y-10 lg:grid-cols-2">
        <AccountPart title="Name and notices">
          <DetailsForm me={me} />
        </AccountPart>
        <AccountPart title="Where you are signed in">
          <SessionList />
        </AccountPart>
        <AccountPart title="Password">
          <PasswordForm />
        </AccountPart>
        <AccountPart title="E-mail address">
          <EmailForm me={me} />
        </AccountPart>
        <AccountPart title="Delete the account">
          <DeleteForm />
        </AccountPart>
      </div>
    </>
  )
}
