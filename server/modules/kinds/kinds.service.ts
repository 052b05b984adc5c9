import { z } from 'zod'
import { getRules } from '#shared/engine/checks/index'
import { identityAttributes } from '#shared/kinds/common'
import { getKind, kindKeys, type KindKey } from '#shared/kinds/index'
import { createSpecsSchema } from '#shared/schemas/specs'
import type { KindList } from '#shared/schemas/kinds'

type KindDescription = KindList['items'][number]

function describeKind(key: KindKey): KindDescription {
  const { attributes, ...kind } = getKind(key)
  const { rules } = getRules(key)
  return {
    ...kind,
    attributes: attributes.map((attribute) => ({
      ...attribute,
      checks: rules.filter(({ reads }) => reads.includes(attribute.key)).map(({ id }) => id),
    })),
    checks: rules.map(({ id, label, rule, worst, unit, basis, reads }) => ({
      id,
      label,
      rule,
      worst,
      unit,
      basis,
      reads: [...reads],
    })),
    jsonSchema: z.toJSONSchema(createSpecsSchema(key)),
  } as KindDescription
}

/** Every kind as data: what can be known of a piece, and which checks read it. */
export function listKinds(): KindList {
  return { identity: identityAttributes as unknown as KindList['identity'], items: kindKeys.map(describeKind) }
}
