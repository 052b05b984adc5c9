import { gzipSync } from 'node:zlib'
import { Trouble } from '../lib/say.mjs'

/** Scripts that `/` loads before anything is clicked, in kB gzipped: the module entries and what is preloaded. */
export async function measureFirstVisit(/** @type {string} */ origin) {
  const html = await (await fetch(`${origin}/`)).text()
  const tags = html.match(/<(script|link)\b[^>]*>/g) ?? []
  const paths = tags.flatMap((tag) => {
    const isScript = tag.startsWith('<script') || /rel="?modulepreload/.test(tag)
    const path = isScript ? /(?:src|href)="?([^"\s>]+\.js)/.exec(tag)?.[1] : undefined
    return path === undefined ? [] : [path]
  })
  if (paths.length === 0) throw new Trouble('The first page names no scripts.')
  let bytes = 0
  for (const path of new Set(paths)) {
    const response = await fetch(new URL(path, origin), { headers: { 'accept-encoding': 'identity' } })
    if (!response.ok) throw new Trouble(`${path} answered ${response.status}.`)
    bytes += gzipSync(Buffer.from(await response.arrayBuffer())).length
  }
  return { files: new Set(paths).size, kB: bytes / 1000 }
}
