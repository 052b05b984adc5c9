import { afterEach, beforeEach, expect, vi, type MockInstance } from 'vitest'

/** React tells of broken markup, missing keys and failed hydration through the console alone: that is a failure. */
let spies: MockInstance[] = []

beforeEach(() => {
  spies = [vi.spyOn(console, 'error'), vi.spyOn(console, 'warn')].map((spy) => spy.mockImplementation(() => undefined))
})

afterEach(() => {
  const unexpected = spies.flatMap((spy) => spy.mock.calls.map((call) => call.map(String).join(' ')))
  for (const spy of spies) spy.mockRestore()
  expect(unexpected, 'unexpected console output').toEqual([])
})

/** For a test that provokes an error on purpose: gives what was said so far, and forgets it. */
export function takeConsoleOutput(): string[] {
  const said = spies.flatMap((spy) => spy.mock.calls.map((call) => call.map(String).join(' ')))
  for (const spy of spies) spy.mockClear()
  return said
}
