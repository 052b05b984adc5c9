import sanitizeHtml from 'sanitize-html'

const options: sanitizeHtml.IOptions = {
  allowedTags: ['p', 'br', 'strong', 'em', 'ul', 'ol', 'li', 'a'],
  allowedAttributes: { a: ['href', 'rel'] },
  allowedSchemes: ['https', 'http'],
  allowProtocolRelative: false,
  transformTags: { a: sanitizeHtml.simpleTransform('a', { rel: 'nofollow ugc noopener' }) },
}

/** Leaves paragraphs, lists, emphasis and plain links of somebody's rich text, and nothing that runs. */
export function sanitizeNotes(html: string): string {
  return sanitizeHtml(html, options).trim()
}
