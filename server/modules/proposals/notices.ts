import { reasons, type ReasonCode } from '#shared/schemas/review'
import type { Database } from '../../db/database'
import { queueNotice } from '../mail/mail.service'
import type { ProposalRow } from './proposals.queries'

type NoticeType = 'message' | 'approved' | 'sent-back' | 'declined'

interface Told {
  readonly type: NoticeType
  readonly words?: string | undefined
  readonly reasonCode?: ReasonCode | undefined
  readonly by: string
  readonly origin: string
}

const labelByCode = new Map<string, string>([
  ...Object.entries(reasons['send-back']),
  ...Object.entries(reasons.decline),
])

function describe({ type, by }: Told, piece: string): { subject: string; text: string; label: string } {
  switch (type) {
    case 'message':
      return {
        subject: `About your proposal for ${piece}`,
        text: `${by} wrote about your proposal for ${piece}.`,
        label: 'Read and answer',
      }
    case 'approved':
      return {
        subject: `Approved: your proposal for ${piece}`,
        text: `${by} approved your proposal for ${piece}. It is on the public page now, with your name. Thank you.`,
        label: 'See what became of it',
      }
    case 'sent-back':
      return {
        subject: `A question about your proposal for ${piece}`,
        text: `${by} sent your proposal for ${piece} back to you. Nothing is lost: change what is asked and send it again.`,
        label: 'Amend it',
      }
    case 'declined':
      return {
        subject: `Declined: your proposal for ${piece}`,
        text: `${by} declined your proposal for ${piece}. What you wrote is kept among your proposals.`,
        label: 'See the reason',
      }
  }
}

/** Tells a proposal's author what happened to it, in the transaction in which it did. */
export async function tellAuthor(tx: Database, row: ProposalRow, told: Told): Promise<void> {
  const brand = row.identity.brand ?? row.gearBrand ?? ''
  const piece = `${brand} ${row.identity.model ?? row.gearModel ?? 'a new piece'}`.trim()
  const { subject, text, label } = describe(told, piece)
  const reason = told.reasonCode === undefined ? undefined : labelByCode.get(told.reasonCode)
  const content = {
    subject,
    paragraphs: [text, ...(reason === undefined ? [] : [`${reason}.`])],
    ...(told.words !== undefined && { quote: told.words }),
    action: { label, url: `${told.origin}/proposals/${row.id}` },
  }
  await queueNotice(tx, { personId: row.authorId, kind: `proposal.${told.type}`, content, origin: told.origin })
}
