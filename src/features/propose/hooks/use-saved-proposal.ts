import { useRef, useState } from 'react'
import type { ProposalPatch } from '#shared/schemas/proposals'
import { createKey } from '../../../lib/create-key'
import { useApp } from '../../../lib/app-context'
import { amendProposal, createProposal, fetchProposal, submitProposal, type SavedProposal } from '../api/save-proposal'
import type { FormBase } from '../model/typed-form'

/** The proposal on the server that the form belongs to. Saves follow one another, each from the version before it. */
export function useSavedProposal(initial: SavedProposal | null) {
  const { api, queryClient } = useApp()
  const [saved, setSaved] = useState(initial)
  const latest = useRef(initial)
  const queue = useRef<Promise<unknown>>(Promise.resolve())
  /** The same request, the same key: sent again after a lost answer, it creates nothing twice. */
  const creation = useRef({ text: '', key: '' })

  const keep = (next: SavedProposal): SavedProposal => {
    latest.current = next
    setSaved(next)
    void queryClient.invalidateQueries({ queryKey: ['proposals'] })
    return next
  }

  function inTurn<T>(work: () => Promise<T>): Promise<T> {
    const turn = queue.current.then(work, work)
    queue.current = turn.catch(() => undefined)
    return turn
  }

  const save = ({ kind, gear }: FormBase, content: ProposalPatch) =>
    inTurn(async () => {
      if (latest.current) return keep(await amendProposal(api, latest.current, content))
      const request = { kind, ...(gear && { gear: gear.slug, baseRevision: gear.revision }), ...content }
      const text = JSON.stringify(request)
      if (creation.current.text !== text) creation.current = { text, key: createKey() }
      return keep(await createProposal(api, request, creation.current.key))
    })
  const submit = () =>
    inTurn(async () => {
      if (!latest.current) throw new Error('There is nothing to send in yet.')
      return keep(await submitProposal(api, latest.current))
    })
  /** Takes the version as it is on the server now, so that the next save starts from there. */
  const catchUp = () =>
    inTurn(async () => {
      if (!latest.current) throw new Error('There is nothing to catch up with.')
      return fetchProposal(api, latest.current.proposal.id)
    })
  return { saved, save, submit, catchUp, adopt: keep }
}
