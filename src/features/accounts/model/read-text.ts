/** A field's text as it was typed. */
export function readText(values: FormData, name: string): string {
  const value = values.get(name)
  return typeof value === 'string' ? value : ''
}
