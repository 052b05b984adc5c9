import { getKind } from '#shared/kinds/index'
import { roleTitles } from '../../../lib/role-titles'
import type { FoundError } from '../model/form-errors'
import { GroupField } from './group-field'
import { SpecField, type SpecFormParts } from './spec-field'

export interface SpecSectionsProps extends SpecFormParts {
  readonly errors: readonly FoundError[]
}

/** Every attribute of the kind, grouped as on its spec sheet. */
export function SpecSections({ errors, ...parts }: SpecSectionsProps) {
  const { attributes } = getKind(parts.base.kind)
  return (['check', 'difference', 'display'] as const).map((role) => {
    const shown = attributes.filter((attribute) => attribute.role === role)
    if (shown.length === 0) return null
    return (
      <section key={role} className="mt-8" aria-labelledby={`specs-${role}`}>
        <h2 id={`specs-${role}`}>{roleTitles[role]}</h2>
        <div className="mt-2 grid gap-x-10 lg:grid-cols-2">
          {shown.map((attribute) =>
            attribute.type === 'group' ? (
              <GroupField key={attribute.key} {...parts} group={attribute} errors={errors} />
            ) : (
              <SpecField key={attribute.key} {...parts} attribute={attribute} />
            ),
          )}
        </div>
      </section>
    )
  })
}
