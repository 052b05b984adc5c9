import { useMemo } from 'react'
import { useQuery } from '@tanstack/react-query'
import { useLocation } from 'react-router-dom'
import { namedPiecesQuery } from '../../../components/suggest/suggest-queries'
import type { Refused } from '../../../lib/problem'
import { useApp, usePreferences } from '../../../lib/app-context'
import { readFormVisit } from '../link/read-form-visit'
import { SetupForm } from './setup-form'

/** The form of the address, with what its search found. `refused`: it was sent, and this is what is wrong with it. */
export function FormOfAddress({ refused = null, isSent = false }: { refused?: Refused | null; isSent?: boolean }) {
  const { api } = useApp()
  const { system } = usePreferences()
  const { search } = useLocation()
  const form = useMemo(() => readFormVisit(new URLSearchParams(search), system), [search, system])
  const { find, findTank, visit, chambers } = form
  const tanks = useQuery({ ...namedPiecesQuery(api, findTank, 'tank'), enabled: findTank !== '' }).data
  const pieces = useQuery({ ...namedPiecesQuery(api, find, null), enabled: find !== '' }).data
  return (
    <SetupForm
      // What is typed belongs to one address; another begins anew from its own texts.
      key={`${JSON.stringify(visit.raw)}${chambers}`}
      form={form}
      refused={refused}
      isSent={isSent}
      foundTanks={findTank === '' ? undefined : tanks}
      foundPieces={find === '' ? undefined : pieces}
    />
  )
}

export function NewSetupPage() {
  return (
    <>
      <h1>Describe your setup</h1>
      <p className="mt-2 max-w-prose text-lg">
        Say what you know, in the units you like; leave the rest open. What is assumed is named in the report, and can
        be changed there.
      </p>
      <FormOfAddress />
    </>
  )
}
