import { describeFooter, type LetterContent, type LetterFooter } from './letter-content'

/** Lines of its own for each part; what breaks lines inside a paragraph would look like ours. */
const flatten = (text: string): string => text.replace(/\s+/g, ' ').trim()

export function writeText({ paragraphs, quote, action }: LetterContent, footer: LetterFooter): string {
  const parts = [
    ...paragraphs.map(flatten),
    ...(quote === undefined ? [] : [quote.trim().replace(/^/gm, '> ')]),
    ...(action === undefined ? [] : [`${flatten(action.label)}:\n${action.url}`]),
    ['-- ', describeFooter(footer), footer.unsubscribePageUrl].filter((line) => line !== undefined).join('\n'),
  ]
  return `${parts.join('\n\n')}\n`
}
