type Branch = { [key: string]: unknown }

const isPlace = (word: string | undefined): boolean => word !== undefined && /^\d{1,3}$/.test(word)

function put(branch: Branch, [word = '', ...rest]: readonly string[], value: unknown): void {
  if (rest.length === 0) {
    branch[word] = value
    return
  }
  if (!Object.hasOwn(branch, word)) branch[word] = isPlace(rest[0]) ? [] : {}
  put(branch[word] as Branch, rest, value)
}

/** Values by dotted path as the object that is sent; entries of lists go by their place, and none is skipped. */
export function nestInputs(flat: Readonly<Record<string, unknown>>): Readonly<Record<string, unknown>> {
  const tree: Branch = {}
  for (const [path, value] of Object.entries(flat)) if (value !== undefined) put(tree, path.split('.'), value)
  return tree
}
