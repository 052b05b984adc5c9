import { slugSchema } from '#shared/schemas/gear'
import { setupSchema } from '#shared/schemas/setup'
import { AppError, type Issue } from '../../lib/errors'
import { toPointer } from '../../lib/to-issues'
import type { Snapshot } from '../catalogue/build-snapshot'
import type { Catalogue } from '../catalogue/catalogue.service'
import { readSetup } from './read-setup'

type Path = readonly PropertyKey[]

const isRecord = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

/** Every place of a request that names a piece of gear, with what stands there. */
function listNamed(body: Readonly<Record<string, unknown>>): readonly (readonly [Path, unknown])[] {
  const setup = isRecord(body.setup) ? body.setup : {}
  const items: readonly unknown[] = Array.isArray(setup.items) ? setup.items : []
  return [
    [['setup', 'tank'], setup.tank],
    ...items.map((item, index) => [['setup', 'items', index], item] as const),
    [['piece'], body.piece],
  ]
}

function findUnknownGear(snapshot: Snapshot, body: Readonly<Record<string, unknown>>): readonly Issue[] {
  return listNamed(body).flatMap(([path, holder]) => {
    const slug = isRecord(holder) ? slugSchema.safeParse(holder.gear).data : undefined
    if (slug === undefined || snapshot.bySlug.has(slug)) return []
    return [{ pointer: toPointer([...path, 'gear']), detail: `there is no piece of gear called "${slug}"` }]
  })
}

/**
 * What is wrong with the setup of a request whose form is wrong too, here or elsewhere: gear that nobody knows, and where
 * the setup itself can be read, what contradicts itself.
 */
export async function findSetupIssues(catalogue: Catalogue, body: unknown): Promise<readonly Issue[]> {
  if (!isRecord(body)) return []
  const snapshot = await catalogue.snapshot()
  const unknown = findUnknownGear(snapshot, body)
  const parsed = setupSchema.safeParse(body.setup)
  if (!parsed.success || unknown.length > 0) return unknown
  try {
    readSetup(snapshot, parsed.data)
    return []
  } catch (error) {
    if (!(error instanceof AppError)) throw error
    return error.issues
  }
}
