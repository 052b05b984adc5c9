import { createTransport } from 'nodemailer'

export interface OutgoingLetter {
  /** Without the angle brackets; the same for every try, so that a mailbox can tell a repetition. */
  readonly messageId: string
  readonly recipient: string
  readonly subject: string
  readonly textBody: string
  readonly htmlBody: string
  readonly unsubscribeUrl: string | null
}

/** Resolves once the mail server has taken the letter over. */
export interface Mailer {
  send(letter: OutgoingLetter): Promise<void>
  close(): void
}

/** An SMTP server by its address. Every wait has an end, well before a job counts as lost. */
export function createMailer(smtpUrl: string, from: string): Mailer {
  const transport = createTransport({
    url: smtpUrl,
    connectionTimeout: 10_000,
    greetingTimeout: 10_000,
    socketTimeout: 30_000,
    disableFileAccess: true,
    disableUrlAccess: true,
  })
  return {
    async send({ messageId, recipient, subject, textBody, htmlBody, unsubscribeUrl }) {
      await transport.sendMail({
        messageId: `<${messageId}>`,
        from: { name: 'Stillfits', address: from },
        // As an object: a name or a comma in it would otherwise be read as more recipients.
        to: { name: '', address: recipient },
        subject,
        text: textBody,
        html: htmlBody,
        headers: {
          'Auto-Submitted': 'auto-generated',
          ...(unsubscribeUrl !== null && {
            'List-Unsubscribe': `<${unsubscribeUrl}>`,
            'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click',
          }),
        },
      })
    },
    close: () => transport.close(),
  }
}
