import { expect, it } from 'vitest'
import { readNext } from '../../../src/features/accounts/model/read-next'

it('goes on to paths of this site, with their query', () => {
  expect(readNext('/gear/rod?units=us#specs')).toBe('/gear/rod?units=us#specs')
})

it('ignores everything that could lead to another site', () => {
  for (const next of [null, '', 'gear', '//evil.example.net', '/\\evil.example.net', '/\t/evil.example.net']) {
    expect(readNext(next), String(next)).toBe('/')
  }
  for (const next of ['https://evil.example.net', 'javascript:alert(1)', '/..//evil.example.net']) {
    expect(readNext(next), next).toBe('/')
  }
})
