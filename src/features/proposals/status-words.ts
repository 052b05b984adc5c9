import type { ProposalStatus } from '#shared/schemas/proposals'

/** Where a proposal stands, in words for whoever made it. */
export const statusWords: Readonly<Record<ProposalStatus, string>> = {
  draft: 'Draft',
  pending: 'Waiting for review',
  'sent-back': 'Sent back to you',
  approved: 'Approved',
  declined: 'Declined',
  withdrawn: 'Withdrawn',
}

/** What that means for its author. */
export const statusMeaning: Readonly<Record<ProposalStatus, string>> = {
  draft: 'Only you see it. Send it in when it is ready.',
  pending: 'A moderator looks at it next. You can still amend it; it keeps its place in the queue.',
  'sent-back': 'A moderator has a question. Amend it and send it again, or answer below.',
  approved: 'It is part of the record now.',
  declined: 'It was not taken over. The reason stands below; what you typed is kept.',
  withdrawn: 'You took it back. What you typed is kept here.',
}

export const statusTextClasses: Readonly<Record<ProposalStatus, string>> = {
  draft: 'text-ink-soft',
  pending: 'text-action',
  'sent-back': 'text-changes',
  approved: 'text-fits',
  declined: 'text-no',
  withdrawn: 'text-ink-soft',
}
