import type { LetterContent, LetterFooter } from './letter-content'
import { writeHtml } from './write-html'
import { writeText } from './write-text'

const longestSubject = 150

/** One line, whatever a name or a model brings along: a line break would begin a header of the sender's choice. */
export function cleanSubject(subject: string): string {
  return subject
    .replace(/[\p{Cc}\s\u2028\u2029]+/gu, ' ')
    .trim()
    .slice(0, longestSubject)
}

/** A letter's subject and both its bodies; everything that came from a person is escaped. */
export function composeLetter(content: LetterContent, footer: LetterFooter = {}) {
  const subject = cleanSubject(content.subject)
  return {
    subject,
    textBody: writeText({ ...content, subject }, footer),
    htmlBody: writeHtml({ ...content, subject }, footer),
  }
}
