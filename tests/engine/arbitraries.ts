import fc from 'fast-check'
import { findContradictions } from '#shared/engine/setup/contradictions'
import type { Item, Piece, Setup, Source, Specs, Value } from '#shared/engine/types'
import { getKind, kindKeys, type KindKey } from '#shared/kinds/index'
import type { Attribute } from '#shared/kinds/types'

const sources = fc.constantFrom<Source>('measured', 'maker', 'estimate')

/** Mostly usual, sometimes merely plausible; three decimals, as nobody types more. */
const measureOf = ([low, high]: readonly [number, number], unit: string): fc.Arbitrary<number> =>
  unit === 'count'
    ? fc.integer({ min: low, max: high })
    : fc.double({ min: low, max: high, noNaN: true }).map((value) => Number(value.toFixed(3)))

function valueOf(attribute: Attribute): fc.Arbitrary<unknown> {
  switch (attribute.type) {
    case 'measure':
      return fc.oneof(
        { weight: 4, arbitrary: measureOf(attribute.usual, attribute.unit) },
        { weight: 1, arbitrary: measureOf(attribute.plausible, attribute.unit) },
      )
    case 'choice':
      return fc.constantFrom(...attribute.options.map(({ value }) => (attribute.numeric ? Number(value) : value)))
    case 'set':
      return fc.subarray(attribute.options.map(({ value }) => (attribute.numeric ? Number(value) : value)))
    case 'boolean':
      return fc.boolean()
    case 'text':
      return fc.constantFrom('one', 'two')
    case 'texts':
      return fc.constant(['invented-tank'])
    case 'group': {
      const fields = fc.record(Object.fromEntries(attribute.fields.map((field) => [field.key, valueOf(field)])), {
        requiredKeys: [...attribute.required],
      })
      return attribute.many ? fc.array(fields, { minLength: 1, maxLength: 3 }) : fields
    }
  }
}

const backed = (attribute: Attribute): fc.Arbitrary<Value> => fc.record({ value: valueOf(attribute), source: sources })

/** A piece of the kind; `known`: how many attributes out of ten are recorded. */
export const pieceOf = (kind: KindKey, known = 9): fc.Arbitrary<Piece> =>
  fc
    .record(
      Object.fromEntries(
        getKind(kind).attributes.map((attribute) => [
          attribute.key,
          fc.oneof(
            { weight: known, arbitrary: backed(attribute) },
            { weight: 10 - known, arbitrary: fc.constant(undefined) },
          ),
        ]),
      ),
    )
    .map((specs) => ({ kind, specs: Object.fromEntries(Object.entries(specs).filter(([, value]) => value)) }))

/** A heater of a size that setups take, so that checks pass, change and fail alike. */
export const anyHeater: fc.Arbitrary<Piece> = fc
  .tuple(
    pieceOf('heater', 10),
    fc.integer({ min: 10, max: 400 }),
    fc.integer({ min: 100, max: 420 }),
    fc.integer({ min: 12, max: 45 }),
  )
  .map(([{ kind, specs }, powerW, lengthMm, diameterMm]) => ({
    kind,
    specs: {
      ...specs,
      form: { value: 'glass-rod', source: 'maker' },
      powerW: { value: powerW, source: 'maker' },
      lengthMm: { value: lengthMm, source: 'measured' },
      diameterMm: { value: diameterMm, source: 'measured' },
      volts: { value: [120], source: 'maker' },
    },
  }))

const maybe = <T>(arbitrary: fc.Arbitrary<T>) => fc.option(arbitrary, { nil: undefined, freq: 2 })
const between = (min: number, max: number) => fc.integer({ min, max })

const given = (values: Readonly<Record<string, unknown>>): Specs =>
  Object.fromEntries(
    Object.entries(values)
      .filter(([, value]) => value !== undefined)
      .map(([key, value]) => [key, { value, source: 'measured' as const }]),
  )

const defined = <T extends object>(values: T): T =>
  Object.fromEntries(Object.entries(values).filter(([, value]) => value !== undefined)) as T

const chamber = (id: string) =>
  fc
    .record({
      lengthMm: maybe(between(50, 260)),
      widthMm: maybe(between(50, 160)),
      waterDepthMm: maybe(between(120, 420)),
      heightMm: maybe(between(200, 460)),
      openingWidthMm: maybe(between(20, 60)),
    })
    .map((sizes) => ({ id, ...defined(sizes) }))

const tank = fc
  .record({
    size: maybe(fc.tuple(between(400, 1200), between(300, 600), between(300, 600))),
    volumeL: between(20, 400),
    wallMm: maybe(between(5, 12)),
    waterLineMm: maybe(between(250, 500)),
    material: maybe(fc.constantFrom('glass', 'acrylic')),
    lid: maybe(fc.constantFrom('none', 'mesh', 'solid')),
    shape: fc.constantFrom('rectangle', 'rectangle', 'rectangle', 'cube', 'cylinder', undefined),
    filtration: maybe(fc.constantFrom('rear-chambers', 'sump', 'none')),
    chambers: fc.oneof(
      fc.constant(undefined),
      chamber('rear').map((one) => [one]),
      fc.tuple(chamber('left'), chamber('right')).map((two) => [...two]),
    ),
  })
  .map(({ size, volumeL, ...rest }) =>
    size
      ? { specs: given({ outerLengthMm: size[0], outerWidthMm: size[1], outerHeightMm: size[2], ...rest }) }
      : { specs: given(rest), volumeL },
  )

const room = fc
  .tuple(maybe(between(10, 22)), maybe(between(18, 26)), maybe(between(24, 34)))
  .map(([coldestC, temperatureC, warmestC]) => defined({ coldestC, temperatureC, warmestC }))

/** A tank stands on one stand. */
const onlyOneStand = <T extends { readonly piece: Piece }>(list: readonly T[]): readonly T[] =>
  list.filter(
    ({ piece }, index) => piece.kind !== 'stand' || list.findIndex((one) => one.piece.kind === 'stand') === index,
  )

/** Other gear of a setup, kinds that matter to each other's checks. */
const items: fc.Arbitrary<Item[]> = fc
  .array(
    fc
      .constantFrom<KindKey>('heater', 'temperature-controller', 'power-strip', 'return-pump', 'wavemaker', 'stand')
      .chain((kind) =>
        fc.record({
          piece: pieceOf(kind),
          quantity: fc.constantFrom(1, 1, 1, 2),
          state: fc.constantFrom<Item['state']>('have', 'planned', 'gone'),
          place: maybe(fc.constantFrom<NonNullable<Item['place']>>({ chamber: 'rear' }, { in: 'display' })),
        }),
      ),
    { maxLength: 4 },
  )
  .map((list) =>
    onlyOneStand(list).map(({ place, ...rest }, index) => ({ id: `item-${index}`, ...rest, ...(place && { place }) })),
  )

/** Setups that contradict nothing, with all sorts of parts left unsaid. */
export const anySetup: fc.Arbitrary<Setup> = fc
  .record({
    units: fc.constantFrom('us' as const, 'metric' as const),
    country: maybe(fc.constantFrom('US', 'GB', 'DE')),
    tank,
    room,
    mains: maybe(fc.record({ outlets: between(0, 6) })),
    goals: maybe(
      fc
        .record({
          temperatureC: maybe(between(23, 27)),
          rockKg: maybe(between(2, 15)),
          sandDepthMm: maybe(between(0, 60)),
        })
        .map(defined),
    ),
    items,
  })
  .map((setup) => defined(setup) as Setup)
  .map((setup) => ({
    ...setup,
    items: setup.items.map(({ place, ...one }) =>
      place && 'chamber' in place && !hasChamber(setup, place.chamber) ? one : { ...one, ...(place && { place }) },
    ),
  }))
  .filter((setup) => findContradictions(setup).length === 0)

const hasChamber = ({ tank: { specs } }: Setup, id: string) =>
  ((specs['chambers']?.value ?? []) as readonly { id: string }[]).some((one) => one.id === id)

/** A piece of the kinds that heat, switch and hold the water. */
export const anyCorePiece: fc.Arbitrary<Piece> = fc.oneof(
  { weight: 3, arbitrary: anyHeater },
  ...(['temperature-controller', 'power-strip', 'tank'] as const).map((kind) => ({
    weight: 1,
    arbitrary: pieceOf(kind),
  })),
)

/** A piece of any kind that has checks of its own or general ones. */
export const anyPiece: fc.Arbitrary<Piece> = fc.oneof(
  { weight: 4, arbitrary: anyHeater },
  ...kindKeys.map((kind) => ({ weight: 1, arbitrary: pieceOf(kind) })),
)
