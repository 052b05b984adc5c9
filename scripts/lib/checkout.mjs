import { createHash } from 'node:crypto'
import { realpathSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'

/** The real path, so that two ways to one checkout share its locks and its database. */
export const checkout = realpathSync(join(dirname(fileURLToPath(import.meta.url)), '..', '..'))

/** Names what belongs to this checkout in places that all checkouts share. */
export const checkoutKey = createHash('sha256').update(checkout).digest('hex').slice(0, 16)

export const dataFolder = join(checkout, '.data')
