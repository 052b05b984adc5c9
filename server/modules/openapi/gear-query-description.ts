import { z } from 'zod'
import { gearQuerySchema } from '#shared/schemas/gear-requests'

const filters = z
  .record(z.string(), z.string())
  .optional()
  .meta({
    param: {
      in: 'query',
      name: 'filters',
      style: 'form',
      explode: true,
      description:
        'Any attribute of the kind as a key of its own, in the unit that the key names: a range (`powerW=50..150`, `50..`, `..150`), ' +
        'one number, options (`form=glass-rod,titanium-rod`), `true` or `false`, or `unknown` for pieces whose value nobody knows ' +
        'yet. Without a kind: `brand` and `status`.',
    },
    example: { powerW: '50..150', form: 'glass-rod,titanium-rod' },
  })

const fixed = gearQuerySchema.shape

/** The query as outsiders are told of it: the fixed keys, and that the kind's attributes are keys too. */
export const describedGearQuerySchema = z.object({
  ...fixed,
  q: fixed.q.describe('Words of a name, a kind or specs, however spelt; the best matches come first'),
  sort: fixed.sort.describe(
    '`relevance` (with `q`), `name`, `updated`, or a measure of the kind such as `powerW`; `-` before it turns it around',
  ),
  filters,
})
