const entities: Readonly<Record<string, string>> = {
  '&amp;': '&',
  '&lt;': '<',
  '&gt;': '>',
  '&quot;': '"',
  '&#39;': "'",
}

/** Notes on record are simple HTML; they are edited as plain paragraphs. */
export function notesToText(html: string): string {
  return html
    .replace(/<li[^>]*>/gi, '- ')
    .replace(/<br[^>]*>|<\/li>/gi, '\n')
    .replace(/<\/(p|ul|ol)>\s*/gi, '\n\n')
    .replace(/<[^>]*>/g, '')
    .replace(/&(?:amp|lt|gt|quot|#39);/g, (entity) => entities[entity] ?? entity)
    .trim()
}

const escapeHtml = (text: string): string => text.replace(/[&<>"]/g, (character) => `&#${character.charCodeAt(0)};`)

export function textToNotes(text: string): string | null {
  const paragraphs = text
    .split(/\n{2,}/)
    .map((paragraph) => paragraph.trim())
    .filter((paragraph) => paragraph !== '')
  if (paragraphs.length === 0) return null
  return paragraphs.map((paragraph) => `<p>${escapeHtml(paragraph).replaceAll('\n', '<br>')}</p>`).join('')
}
