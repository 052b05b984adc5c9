/** What a letter says, before it becomes text and HTML. */
export interface LetterContent {
  readonly subject: string
  readonly paragraphs: readonly string[]
  /** Somebody's own words, set apart from ours. */
  readonly quote?: string
  /** The one thing to do: a label such as "Confirm your address", and where. */
  readonly action?: { readonly label: string; readonly url: string }
}

export interface LetterFooter {
  /** The page, not the one-click address: opening a link changes nothing. */
  readonly unsubscribePageUrl?: string
}

const notice = 'Sent by Stillfits, because of an account with this address.'

export function describeFooter({ unsubscribePageUrl }: LetterFooter): string {
  return unsubscribePageUrl === undefined ? notice : `${notice} To get no more such notices:`
}
