import { ErrorState } from '../../../components/ui/error-state'
import type { ProposeForm } from '../hooks/use-propose-form'
import type { useSend } from '../hooks/use-send'
import { findAmended, findMeanwhile } from '../model/rebase'
import { MeanwhilePanel, SignInPanel } from './halt-panel'

export interface HaltPanelsProps {
  readonly send: ReturnType<typeof useSend>
  readonly propose: ProposeForm
  /** Address that the visitor comes back to. */
  readonly next: string
}

/** What keeps the proposal from being sent, and the way on. */
export function HaltPanels({ send, propose, next }: HaltPanelsProps) {
  const { halt, attempt, saved } = send
  if (!halt) return null
  const { base, printer } = propose
  switch (halt.reason) {
    case 'signed-out':
      return <SignInPanel next={next} attempt={attempt} />
    case 'moved-on':
      return (
        <MeanwhilePanel
          title="Somebody changed this piece while you typed"
          attempt={attempt}
          changes={findMeanwhile(base, halt.gear, propose.readNow().values, printer)}
          goOn="Go on from the record as it is now"
          onGoOn={() => {
            propose.rebase(halt.gear)
            send.goOn()
          }}
        />
      )
    case 'amended':
      return (
        <MeanwhilePanel
          title="This proposal was changed in another tab or on another device"
          attempt={attempt}
          changes={findAmended(
            base.kind,
            saved?.proposal.values ?? {},
            halt.theirs.proposal.values,
            propose.readNow().values,
            printer,
          )}
          goOn="Go on with what stands here"
          onGoOn={() => send.keepMine(halt.theirs)}
        />
      )
    case 'failed':
      return halt.words.length === 0 ? null : (
        <div className="mt-6">
          <ErrorState title={halt.title}>
            {halt.words.map((words) => (
              <p key={words}>{words}</p>
            ))}
            <p>Everything you typed is still here.</p>
          </ErrorState>
        </div>
      )
  }
}
