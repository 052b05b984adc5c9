import { Link } from 'react-router-dom'
import type { Attribute } from '#shared/kinds/types'
import type { Gear } from '#shared/schemas/gear'
import { correctHref } from '../correct-href'

/** Numbers that checks read and nobody has recorded, each with how to measure it. */
export function MissingNumbers({
  gear,
  attributes,
}: {
  readonly gear: Gear
  readonly attributes: readonly Attribute[]
}) {
  const missing = attributes.filter(({ role, key }) => role === 'check' && gear.specs[key] === undefined)
  if (missing.length === 0) return null
  return (
    <section className="mt-8 border-[1.5px] border-dashed border-ink-soft px-5 py-4">
      <h2>Nobody has recorded yet</h2>
      <p className="mt-1 max-w-prose text-sm text-ink-soft">
        Checks that need one of these answer “not enough data” for this piece. Have it at hand? This is where to
        measure.
      </p>
      <dl className="mt-3 grid gap-x-8 gap-y-2 sm:grid-cols-2">
        {missing.map((attribute) => (
          <div key={attribute.key} className="text-sm">
            <dt className="font-semibold first-letter:uppercase">{attribute.label}</dt>
            <dd className="text-ink-soft">
              {attribute.guide ?? 'From its box or its maker’s sheet.'}{' '}
              <Link
                to={correctHref(gear.slug, attribute)}
                className="link inline-block min-h-6 print:hidden"
                aria-label={`Add the ${attribute.label}`}
              >
                Add it
              </Link>
            </dd>
          </div>
        ))}
      </dl>
    </section>
  )
}
