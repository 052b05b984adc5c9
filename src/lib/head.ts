/** What a page says of itself to search engines, tabs and link previews. */
export interface Head {
  readonly title: string
  readonly description: string
  /** Path of the one address under which the page should be known. */
  readonly canonical?: string
  readonly isUnlisted?: boolean
  /** Only for visitors without scripts: how soon to load the page again. */
  readonly refreshSeconds?: number
  /** schema.org data. */
  readonly jsonLd?: object
}

const siteName = 'Stillfits'

function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`)
}

export function printTitle({ title }: Head): string {
  return title === siteName ? title : `${title} · ${siteName}`
}

interface Meta {
  readonly attribute: 'name' | 'property'
  readonly key: string
  readonly content: string
}

export function listMeta(head: Head): readonly Meta[] {
  return [
    { attribute: 'name', key: 'description', content: head.description },
    ...(head.isUnlisted ? [{ attribute: 'name', key: 'robots', content: 'noindex' } as const] : []),
    { attribute: 'property', key: 'og:site_name', content: siteName },
    { attribute: 'property', key: 'og:type', content: 'website' },
    { attribute: 'property', key: 'og:title', content: head.title },
    { attribute: 'property', key: 'og:description', content: head.description },
  ]
}

/** The head of a page as HTML. Inside a script `<` would end it early. */
export function writeHead(head: Head): string {
  const { canonical, refreshSeconds, jsonLd } = head
  return [
    `<title>${escapeHtml(printTitle(head))}</title>`,
    ...listMeta(head).map(
      ({ attribute, key, content }) => `<meta ${attribute}="${key}" content="${escapeHtml(content)}">`,
    ),
    ...(canonical === undefined ? [] : [`<link rel="canonical" href="${escapeHtml(canonical)}">`]),
    ...(refreshSeconds === undefined
      ? []
      : [`<noscript><meta http-equiv="refresh" content="${refreshSeconds}"></noscript>`]),
    ...(jsonLd === undefined
      ? []
      : [`<script type="application/ld+json">${JSON.stringify(jsonLd).replace(/</g, '\\u003c')}</script>`]),
  ].join('\n')
}

/** Brings the head of the open document up to date after a navigation. */
export function applyHead(head: Head): void {
  document.title = printTitle(head)
  for (const { attribute, key, content } of listMeta(head)) {
    const found = document.head.querySelector(`meta[${attribute}="${key}"]`)
    const meta = found ?? document.head.appendChild(document.createElement('meta'))
    meta.setAttribute(attribute, key)
    meta.setAttribute('content', content)
  }
  if (!head.isUnlisted) document.head.querySelector('meta[name="robots"]')?.remove()
  document.head.querySelector('script[type="application/ld+json"]')?.remove()
  const link = document.head.querySelector<HTMLLinkElement>('link[rel="canonical"]')
  if (head.canonical === undefined) link?.remove()
  else {
    const canonical = link ?? document.head.appendChild(document.createElement('link'))
    canonical.setAttribute('rel', 'canonical')
    canonical.setAttribute('href', head.canonical)
  }
}
