import type { Evidence } from '#shared/schemas/evidence'
import type { ProposalStatus } from '../../db/schema/proposals'
import type { Actor } from '../../lib/actor'
import { canRemove } from './evidence.policy'

interface File extends Pick<Evidence, 'id' | 'kind' | 'contentType' | 'bytes' | 'width' | 'height' | 'caption'> {
  readonly uploaderId: number
  readonly thumbnailKey: string | null
  readonly publishedAt: Date | null
  readonly createdAt: Date
}

export function presentEvidence(file: File, status: ProposalStatus | null, actor: Actor | null): Evidence {
  const { id, kind, contentType, bytes, width, height, caption } = file
  const url = `/api/v1/evidence/${id}`
  return {
    id,
    kind,
    contentType,
    bytes,
    width,
    height,
    caption,
    isPublished: file.publishedAt !== null,
    createdAt: file.createdAt.toISOString(),
    url,
    thumbnailUrl: file.thumbnailKey === null ? null : `${url}/thumbnail`,
    can: { remove: canRemove(actor, file, status) },
  }
}
