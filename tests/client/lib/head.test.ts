import { describe, expect, it } from 'vitest'
import { writeHead } from '../../../src/lib/head'

describe('the head of a page', () => {
  it('escapes what stands in attributes and text', () => {
    const html = writeHead({ title: '<script>"&', description: `"'><img>` })
    expect(html).not.toMatch(/<script>"|<img>/)
  })

  it('cannot be ended early by structured data', () => {
    const html = writeHead({ title: 't', description: 'd', jsonLd: { name: '</script><script>alert(1)</script>' } })
    expect(html.match(/<\/script>/g)).toHaveLength(1)
    const [, json = ''] = /<script type="application\/ld\+json">(.*)<\/script>/.exec(html) ?? []
    expect(JSON.parse(json)).toEqual({ name: '</script><script>alert(1)</script>' })
  })

  it('keeps pages that are no content out of search engines', () => {
    expect(writeHead({ title: 't', description: 'd', isUnlisted: true })).toContain('content="noindex"')
    expect(writeHead({ title: 't', description: 'd' })).not.toContain('noindex')
  })
})
