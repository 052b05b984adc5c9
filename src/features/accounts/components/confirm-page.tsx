import { useState } from 'react'
import { Link, useSearchParams } from 'react-router-dom'
import { buttonClass } from '../../../components/ui/button-class'
import { SubmitForm } from '../../../components/ui/submit-form'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { DoneNote } from './done-note'
import { NarrowPage } from './narrow-page'

/** Asks for a press: programs that look through letters open their links too. */
export function ConfirmPage() {
  const { api } = useApp()
  const [search] = useSearchParams()
  const [isConfirmed, setIsConfirmed] = useState(false)
  return (
    <NarrowPage title="Confirm your address">
      {isConfirmed ? (
        <DoneNote>
          <p>Your address is confirmed.</p>
          <p>
            <Link to={paths.signIn('/')} className={buttonClass({ variant: 'primary' })}>
              Sign in
            </Link>
          </p>
        </DoneNote>
      ) : (
        <SubmitForm
          id="confirm"
          labels={{ token: 'The link' }}
          action="Confirm the address"
          onSend={async () => {
            await api.post('/people/confirm', { token: search.get('token') ?? '' })
            setIsConfirmed(true)
          }}
        >
          {() => <p>One press, and the address that this link was sent to is yours here.</p>}
        </SubmitForm>
      )}
    </NarrowPage>
  )
}
