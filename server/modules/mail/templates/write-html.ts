import { describeFooter, type LetterContent, type LetterFooter } from './letter-content'

function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`)
}

/** Only what begins as a web address becomes a link, whatever a caller hands in. */
function writeLink(url: string, label: string): string {
  if (!/^https?:\/\//.test(url)) return escapeHtml(label)
  return `<a href="${escapeHtml(url)}" style="color:#2447c6">${escapeHtml(label)}</a>`
}

const quoteStyle = 'margin:16px 0;padding:0 0 0 12px;border-left:3px solid #c8c5b8;white-space:pre-wrap'
const bodyStyle = 'margin:0;padding:24px;background:#f5f2ea;color:#11262b;font:16px/1.5 sans-serif'

export function writeHtml({ subject, paragraphs, quote, action }: LetterContent, footer: LetterFooter): string {
  const { unsubscribePageUrl } = footer
  const parts = [
    ...paragraphs.map((text) => `<p>${escapeHtml(text)}</p>`),
    ...(quote === undefined ? [] : [`<blockquote style="${quoteStyle}">${escapeHtml(quote)}</blockquote>`]),
    ...(action === undefined
      ? []
      : [`<p><strong>${writeLink(action.url, action.label)}</strong><br>${escapeHtml(action.url)}</p>`]),
    `<p style="font-size:13px;color:#4b6064">${escapeHtml(describeFooter(footer))}${
      unsubscribePageUrl === undefined ? '' : ` ${writeLink(unsubscribePageUrl, 'unsubscribe')}`
    }</p>`,
  ]
  return (
    `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>${escapeHtml(subject)}</title></head>` +
    `<body style="${bodyStyle}"><div style="max-width:560px">${parts.join('')}</div></body></html>`
  )
}
