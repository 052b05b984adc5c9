// @vitest-environment node
import { renderToString } from 'react-dom/server'
import { StaticRouter } from 'react-router-dom'
import { expect, it } from 'vitest'
import { Specimen } from '../specimen/specimen'

const html = renderToString(
  <StaticRouter location="/find">
    <Specimen />
  </StaticRouter>,
)

/** Whether a tag with all of these attributes, in any order, is in the page. */
function hasTag(page: string, name: string, attributes: Record<string, string>): boolean {
  const tags = page.match(new RegExp(`<${name} [^>]*>`, 'g')) ?? []
  return tags.some((tag) => Object.entries(attributes).every(([key, value]) => tag.includes(` ${key}="${value}"`)))
}

it('renders every building block without a browser', () => {
  expect(html.includes('Which heater still fits?')).toBe(true)
  expect(html.includes('role="listbox"')).toBe(true)
})

it('writes no inline style, which a strict content security policy would refuse', () => {
  expect(html.match(/<[^>]* style=[^>]*>/g)).toBeNull()
  expect(html.includes('<style')).toBe(false)
})

it('offers units and theme as plain forms that come back to the page', () => {
  const forms = html.split('<form').slice(1)
  expect(forms).toHaveLength(2)
  for (const form of forms) {
    expect(hasTag(form, 'input', { type: 'hidden', name: 'next', value: '/find?q=1' })).toBe(true)
    expect(form.slice(0, form.indexOf('>'))).toMatch(
      /action="\/preferences".* method="get"|method="get".* action="\/preferences"/,
    )
  }
  expect(hasTag(html, 'button', { name: 'units', value: 'metric', 'aria-pressed': 'false' })).toBe(true)
  expect(hasTag(html, 'button', { name: 'theme', value: 'dark', 'aria-pressed': 'false' })).toBe(true)
})

it('links every dimension to its field, for use without scripts', () => {
  const outside = { href: '#tank.outerLengthMm', 'aria-label': 'Outside length 23.2\u00a0in, assumed' }
  expect(hasTag(html, 'a', outside)).toBe(true)
  const chamber = { href: '#tank.chambers.0.lengthMm', 'aria-label': 'Heater chamber, along the tank 4\u00a0in' }
  expect(hasTag(html, 'a', chamber)).toBe(true)
})

it('describes each drawing in words, with what is assumed', () => {
  expect(html.includes('Outside 23.2\u00a0in long (assumed)')).toBe(true)
  expect(html.includes('stands upright in Heater chamber, 1.4\u00a0in to spare under the water line.')).toBe(true)
})
