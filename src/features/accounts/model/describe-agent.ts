const systems = [
  [/android/i, 'Android'],
  [/iphone|ipad/i, 'iOS'],
  [/windows/i, 'Windows'],
  [/mac os/i, 'macOS'],
  [/linux/i, 'Linux'],
] as const

/** What a browser said of itself, in few words: enough to tell one's telephone from one's desk. */
export function describeAgent(agent: string | null): string {
  const system = systems.find(([pattern]) => agent !== null && pattern.test(agent))?.[1]
  if (system === undefined) return 'An unnamed browser'
  const isPhone = /mobile/i.test(agent ?? '')
  return `${isPhone ? 'A phone' : 'A browser'} on ${system}`
}
