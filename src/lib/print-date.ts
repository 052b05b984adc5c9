const months = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
]

/** "3 March 2025". By hand: server and browser must write the same, whatever their locale and time zone. */
export function printDate(iso: string): string {
  const [year, month, day] = iso.slice(0, 10).split('-').map(Number)
  const name = months[(month ?? 0) - 1]
  return name === undefined || !day || !year ? iso : `${day} ${name} ${year}`
}

/** "3 March 2025, 14:05 UTC" */
export const printMoment = (iso: string): string => `${printDate(iso)}, ${iso.slice(11, 16)} UTC`
