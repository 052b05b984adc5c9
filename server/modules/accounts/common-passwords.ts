let common: Promise<ReadonlySet<string>> | null = null

async function loadCommon(): Promise<ReadonlySet<string>> {
  const { dictionary } = await import('@zxcvbn-ts/language-common')
  return new Set(dictionary['passwords-common'].slice(0, 10_000))
}

/** Whether this is one of the 10 000 commonest passwords. Their list is read when it is first asked for. */
export async function isCommonPassword(password: string): Promise<boolean> {
  common ??= loadCommon()
  return (await common).has(password)
}
