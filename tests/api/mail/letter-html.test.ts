// @vitest-environment jsdom
import { describe, expect, it } from 'vitest'
import { composeLetter } from '../../../server/modules/mail/templates/compose-letter'

describe('the HTML of a letter', () => {
  it.each([
    '<script>alert(1)</script>',
    '"><img src=x onerror=alert(1)>',
    "'><svg onload=alert(1)>",
    '</blockquote></div><iframe src=https://evil.example>',
    '<a href="javascript:alert(1)">x</a>',
  ])('shows %s from a person as the text it is', (attack) => {
    const action = { label: attack, url: 'https://fits.example/?a="&b=<' }
    const letter = composeLetter({ subject: attack, paragraphs: [attack], quote: attack, action })
    expect(letter.textBody).toContain(attack)
    const parsed = new DOMParser().parseFromString(letter.htmlBody, 'text/html')
    expect(parsed.querySelectorAll('script, img, svg, iframe, [onerror], [onload]')).toHaveLength(0)
    expect([...parsed.querySelectorAll('a')].map((link) => link.getAttribute('href'))).toEqual([action.url])
    expect(parsed.querySelector('blockquote')?.textContent).toBe(attack)
    expect(parsed.title).toBe(attack)
  })

  it('makes no link of an address that is not a web address', () => {
    const action = { label: 'Press', url: 'javascript:alert(1)' }
    expect(composeLetter({ subject: 'S', paragraphs: [], action }).htmlBody).not.toContain('<a ')
  })
})
