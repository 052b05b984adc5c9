import { useEffect, useEffectEvent, useState } from 'react'
import { useNavigate } from 'react-router-dom'
import type { Gear } from '#shared/schemas/gear'
import type { ProposalPatch } from '#shared/schemas/proposals'
import { gearEntryQuery } from '../../../components/setup/gear-entry'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { toApiError } from '../../../lib/problem'
import { sessionQuery, useSignedIn } from '../../../lib/session'
import type { SavedProposal } from '../api/save-proposal'
import { writeFlags } from '../model/doubts'
import { flattenErrors, readRefusal, type FoundError } from '../model/form-errors'
import { hasChanges, type ReadForm } from '../model/read-typed'
import type { ProposeForm } from './use-propose-form'
import { useSavedProposal } from './use-saved-proposal'

/** Why it is not sent yet. */
export type Halt =
  | { readonly reason: 'signed-out' }
  | { readonly reason: 'moved-on'; readonly gear: Gear }
  | { readonly reason: 'amended'; readonly theirs: SavedProposal }
  | { readonly reason: 'failed'; readonly title: string; readonly words: readonly string[] }

const restMs = 4_000

/** Drafts to the server once they rest, and the whole to the review desk when it is sent. */
export function useSend(propose: ProposeForm, initial: SavedProposal | null, onSent: () => void) {
  const { api, queryClient } = useApp()
  const navigate = useNavigate()
  const person = useSignedIn()
  const { form, base, typed } = propose
  const { saved, save, submit, catchUp, adopt } = useSavedProposal(initial)
  const [halt, setHalt] = useState<Halt | null>(null)
  const [attempt, setAttempt] = useState(0)
  /** As they were when it was last sent: a list that came and went with every letter would take focus while somebody types. */
  const [told, setTold] = useState<readonly FoundError[]>([])
  const [isSent, setIsSent] = useState(false)
  const [isSending, setIsSending] = useState(false)
  const [savedText, setSavedText] = useState<string | null>(null)

  const stop = (next: Halt) => {
    setHalt(next)
    setAttempt((count) => count + 1)
  }

  const write = (read: ReadForm): ProposalPatch => ({
    ...(base.gear && { baseRevision: base.gear.revision }),
    identity: read.identity,
    values: read.values,
    summary: form.getValues('summary').trim() || null,
    flags: writeFlags(propose.doubtsNow(read), form.getValues()),
  })

  const saveNow = async (read: ReadForm): Promise<SavedProposal> => {
    const next = await save(base, write(read))
    setSavedText(JSON.stringify(form.getValues()))
    return next
  }

  async function explain(error: unknown): Promise<void> {
    const failure = toApiError(error)
    if (failure.status === 401) return stop({ reason: 'signed-out' })
    if (failure.status === 412) return stop({ reason: 'amended', theirs: await catchUp() })
    if (failure.status !== 422) return stop({ reason: 'failed', title: failure.title, words: [failure.message] })
    const refused = readRefusal(base.kind, failure)
    for (const one of refused)
      if ('path' in one) form.setError(one.path as never, { type: 'server', message: one.message })
    setTold(refused.flatMap((one) => ('path' in one ? [one] : [])))
    const words = refused.flatMap((one) => ('path' in one ? [] : [one.message]))
    stop({ reason: 'failed', title: 'It was not taken yet; everything you typed is kept', words })
  }

  const autosave = useEffectEvent(async () => {
    const isOpen = saved === null || (saved.proposal.status === 'draft' && saved.proposal.can.amend)
    const read = propose.readNow()
    if (!person?.can.contribute || isSending || halt || !isOpen || !hasChanges(read)) return
    if (savedText === JSON.stringify(form.getValues())) return
    // A draft that could not be saved is still in the browser; sending it tells why.
    await saveNow(read).catch(() => undefined)
  })
  useEffect(() => {
    const timer = setTimeout(() => void autosave(), restMs)
    return () => clearTimeout(timer)
  }, [typed, person])

  async function send(read: ReadForm): Promise<void> {
    const { person: now } = await queryClient.fetchQuery({ ...sessionQuery(api), staleTime: 0 })
    if (now === null) return stop({ reason: 'signed-out' })
    if (base.gear) {
      const gear = await queryClient.fetchQuery({ ...gearEntryQuery(api, base.gear.slug), staleTime: 0 })
      if (gear.revision !== base.gear.revision) return stop({ reason: 'moved-on', gear })
    }
    const next = await saveNow(read)
    const sent = next.proposal.status === 'pending' ? next : await submit()
    setIsSent(true)
    onSent()
    await navigate(`${paths.proposal(sent.proposal.id)}?sent=1`)
  }

  const trySend = async (read: ReadForm): Promise<void> => {
    setIsSending(true)
    setHalt(null)
    setTold([])
    try {
      await send(read)
    } catch (error) {
      await explain(error).catch((worse: unknown) => {
        const { title, message } = toApiError(worse)
        stop({ reason: 'failed', title, words: [message] })
      })
    } finally {
      setIsSending(false)
    }
  }

  return {
    person,
    saved,
    isSaved: savedText !== null && savedText === JSON.stringify(typed),
    halt,
    attempt,
    told,
    isSending,
    isSent,
    onSubmit: form.handleSubmit(trySend, (errors) => {
      setHalt(null)
      setTold(flattenErrors(errors))
      setAttempt((count) => count + 1)
    }),
    goOn: () => setHalt(null),
    /** Goes on from what another tab or device saved, with what is typed here. */
    keepMine: (theirs: SavedProposal) => {
      adopt(theirs)
      setHalt(null)
    },
    /** The proposal that a file is attached to: saved with what can be read so far. */
    findProposalId: async (): Promise<string | null> => {
      if (saved) return saved.proposal.id
      const read = propose.readNow()
      try {
        return (await saveNow(read)).proposal.id
      } catch (error) {
        await explain(error)
        return null
      }
    },
  }
}
