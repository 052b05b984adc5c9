import { fileTypeFromBuffer } from 'file-type'
import { AppError } from '../../lib/errors'

export type EvidenceType = 'image/jpeg' | 'image/png' | 'image/webp' | 'application/pdf'

const endings: Readonly<Record<EvidenceType, readonly string[]>> = {
  'image/jpeg': ['jpg', 'jpeg', 'jpe', 'jfif'],
  'image/png': ['png'],
  'image/webp': ['webp'],
  'application/pdf': ['pdf'],
}

/** Endings of names that a machine may act upon: inside a name they are there to mislead. */
const knownEndings = new Set([
  ...Object.values(endings).flat(),
  ...'svg html htm xhtml xml mht js mjs css php phtml asp aspx jsp cgi pl py sh bat cmd com exe msi dll jar'.split(' '),
  ...'zip gz tar rar 7z gif bmp tif tiff heic avif doc docx docm xls xlsx xlsm swf lnk scr vbs ps1 apk'.split(' '),
])

const taken = 'Photos as JPEG, PNG or WebP and documents as PDF are taken. Nothing else was changed.'

function refuse(reason: string): never {
  throw new AppError('unsupported-media-type', `${reason} ${taken}`)
}

function checkName(name: string, type: EvidenceType): void {
  const [, ...parts] = name.toLowerCase().split('.')
  const last = parts.pop()
  if (last !== undefined && last !== '' && !endings[type].includes(last)) {
    refuse(`The name ends with ".${last.slice(0, 12)}", but the content is something else.`)
  }
  if (parts.some((part) => knownEndings.has(part))) refuse('The name has two endings.')
}

const markup = /<(?:!doctype|html|script|body|iframe|\?php)[\s>/]|<\?php/i

/** A picture or a document alone: a page or a program hidden in it could be run by whoever is tricked into it. */
function checkSingle(content: Buffer, type: EvidenceType): void {
  const text = content.toString('latin1')
  if (type !== 'application/pdf') {
    if (markup.test(text)) refuse('There is a page hidden in the picture.')
    return
  }
  if (markup.test(text.slice(0, 1024))) refuse('There is a page hidden in the document.')
  const end = text.lastIndexOf('%%EOF')
  if (end === -1 || text.slice(end + 5).trim() !== '') refuse('The document does not end where a PDF ends.')
}

/** What the file is by its content; its name may not say otherwise, nor what the browser declared. */
export async function detectType(content: Buffer, name: string): Promise<EvidenceType> {
  const found = await fileTypeFromBuffer(content)
  if (found === undefined || !(found.mime in endings))
    refuse('This is neither a photo nor a document that we can take.')
  const type = found.mime as EvidenceType
  checkName(name, type)
  checkSingle(content, type)
  return type
}
