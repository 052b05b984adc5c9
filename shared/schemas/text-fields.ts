import { z } from 'zod'

/** Some paragraphs of plain text: line breaks stay, other control characters are refused. */
export function wordsSchema(maxLength: number) {
  return z
    .string({ error: 'must be text' })
    .trim()
    .min(1, 'must not be empty')
    .max(maxLength, `must be at most ${maxLength} characters`)
    .refine((text) => !/\p{Cc}/u.test(text.replaceAll(/[\n\r\t]/g, '')), 'must not hold control characters')
}

/** A word that ends in a colon and goes straight on is an address of some sort: `data:…`, `javascript:…`, `http://…`. */
const addressPattern = /^[a-z][a-z0-9+.-]*:\S|:\/\//i

/** Without a name and password in it, which would hide where it leads. */
export function isHttpsAddress(text: string): boolean {
  return /^https:\/\/[\p{L}\p{N}]([\p{L}\p{N}.-]*[\p{L}\p{N}])?(:\d{1,5})?([/?#]\S*)?$/iu.test(text)
}

/** Plain words may hold addresses, all of them https: a reader follows them. */
export function hasOnlyHttpsAddresses(text: string): boolean {
  return text.split(/\s+/).every((word) => {
    const bare = word.replaceAll(/^[("'<[]+|[)"'>\].,;]+$/g, '')
    return !addressPattern.test(bare) || isHttpsAddress(bare)
  })
}

const days = 24 * 60 * 60 * 1000

/** A day that has come somewhere on Earth. */
export const pastDaySchema = z.iso
  .date('must be a day such as 2025-03-31')
  .refine((day) => Date.parse(day) <= Date.now() + days, 'must not be in the future')
