const minuteMs = 60_000

const steps = [
  { name: 'week', minutes: 7 * 24 * 60, from: 21 * 24 * 60 },
  { name: 'day', minutes: 24 * 60, from: 48 * 60 },
  { name: 'hour', minutes: 60, from: 90 },
  { name: 'minute', minutes: 1, from: 0 },
] as const

/** "5 minutes", "26 hours", "3 days": as coarse as one says it. */
export function printSpan(ms: number): string {
  const minutes = Math.max(0, ms / minuteMs)
  const step = steps.find(({ from }) => minutes >= from) ?? steps[3]
  const count = Math.max(1, Math.round(minutes / step.minutes))
  return `${count} ${step.name}${count === 1 ? '' : 's'}`
}

/** How long ago something was, as of a moment that browser and server agree on. */
export const printSince = (iso: string, now: number): string => printSpan(now - Date.parse(iso))

/** "14:09", for a time that runs out. */
export function printCountdown(ms: number): string {
  const seconds = Math.max(0, Math.ceil(ms / 1000))
  return `${Math.floor(seconds / 60)}:${String(seconds % 60).padStart(2, '0')}`
}
