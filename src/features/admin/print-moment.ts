/** Minutes in UTC, so that two admins speak of the same one. */
export function printMoment(iso: string): string {
  return `${iso.slice(0, 10)} ${iso.slice(11, 16)} UTC`
}
