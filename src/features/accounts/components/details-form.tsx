import { useState } from 'react'
import type { Me } from '#shared/schemas/accounts'
import { SubmitForm } from '../../../components/ui/submit-form'
import { TextField } from '../../../components/ui/text-field'
import { useApp } from '../../../lib/app-context'
import { sessionQuery } from '../../../lib/session'
import { meQuery } from '../api/account-queries'
import { readText } from '../model/read-text'
import { DoneLine } from './done-line'

export function DetailsForm({ me }: { readonly me: Me }) {
  const { api, queryClient } = useApp()
  const [done, setDone] = useState('')
  return (
    <>
      <SubmitForm
        id="details"
        labels={{ name: 'Name', wantsNotices: 'Notices' }}
        action="Save"
        variant="plain"
        onSend={async (values) => {
          setDone('')
          const change = { name: readText(values, 'name'), wantsNotices: values.has('wantsNotices') }
          queryClient.setQueryData(meQuery(api).queryKey, (await api.patch('/me', change)) as Me)
          await queryClient.invalidateQueries({ queryKey: sessionQuery(api).queryKey })
          setDone('Saved.')
        }}
      >
        {(field) => (
          <>
            <TextField {...field('name')} defaultValue={me.name} autoComplete="nickname" maxLength={40} />
            <label className="flex min-h-11 items-center gap-3">
              <input type="checkbox" name="wantsNotices" defaultChecked={me.wantsNotices} className="size-5" />
              Write to me when something of mine is decided
            </label>
          </>
        )}
      </SubmitForm>
      <DoneLine message={done} />
    </>
  )
}
