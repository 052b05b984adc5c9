import type { ReactNode } from 'react'

/** What a measure spans, whatever it is a measure of. */
export type SketchShape =
  | 'across'
  | 'front-to-back'
  | 'height'
  | 'water-depth'
  | 'opening'
  | 'diameter'
  | 'rod'
  | 'thickness'
  | 'above-water'
  | 'from-floor'
  | 'cord'

const byKey: readonly (readonly [RegExp, SketchShape])[] = [
  [/opening|bore/i, 'opening'],
  [/diameter/i, 'diameter'],
  [/immersion|waterline|waterdepth|mindepth/i, 'water-depth'],
  [/^wall|bottom|glassmm|rim.*mm$/i, 'thickness'],
  [/mountheight/i, 'above-water'],
  [/ceiling|tanktop/i, 'from-floor'],
  [/cord|hose|tube/i, 'cord'],
  [/width/i, 'front-to-back'],
  [/height/i, 'height'],
  [/length|span/i, 'across'],
]

/** Told by the key of an attribute; undefined where it is no length that could be shown. A heater's length is that of a rod. */
export function findSketch(key: string, kind?: string): SketchShape | undefined {
  if (!key.endsWith('Mm')) return undefined
  const shape = byKey.find(([pattern]) => pattern.test(key))?.[1]
  return shape === 'across' && kind === 'heater' ? 'rod' : shape
}

const box = (
  <path d="M10 20 22 10H54V32L42 42H10ZM10 20H42M42 20V42M42 20 54 10" fill="none" className="stroke-ink-soft" />
)
const tub = <path d="M14 8V42H50V8" fill="none" className="stroke-ink-soft" />
const ends = (...points: readonly (readonly [number, number])[]) =>
  points.map(([x, y]) => `M${x - 3} ${y + 3}l6-6`).join('')

const shapes: Readonly<Record<SketchShape, ReactNode>> = {
  across: (
    <>
      {box}
      <path d={`M10 47H42${ends([10, 47], [42, 47])}`} />
    </>
  ),
  'front-to-back': (
    <>
      {box}
      <path d={`M46 46 58 36${ends([46, 46], [58, 36])}`} />
    </>
  ),
  height: (
    <>
      {box}
      <path d={`M4 20V42${ends([4, 20], [4, 42])}`} />
    </>
  ),
  'water-depth': (
    <>
      <path d="M15 16H49V41H15Z" className="fill-water stroke-transparent" />
      {tub}
      <path d={`M15 16H49M32 16V42${ends([32, 16], [32, 42])}`} />
    </>
  ),
  opening: (
    <>
      <path d="M8 14H56V40H8Z" fill="none" className="stroke-ink-soft" />
      <path d="M18 20H46V34H18Z" fill="none" strokeDasharray="3 2" className="stroke-ink" />
      <path d={`M18 27H46${ends([18, 27], [46, 27])}`} />
    </>
  ),
  diameter: (
    <>
      <circle cx="32" cy="25" r="15" fill="none" className="stroke-ink-soft" />
      <path d={`M17 25H47${ends([17, 25], [47, 25])}`} />
    </>
  ),
  rod: (
    <>
      <rect x="8" y="14" width="44" height="12" rx="6" fill="none" className="stroke-ink-soft" />
      <path d="M52 20h8" className="stroke-ink-soft" />
      <path d={`M8 36H52${ends([8, 36], [52, 36])}`} />
    </>
  ),
  thickness: (
    <>
      <path d="M24 6V44H34V6Z" className="fill-water stroke-ink-soft" />
      <path d={`M12 24H24M34 24H48${ends([24, 24], [34, 24])}`} />
    </>
  ),
  'above-water': (
    <>
      <path d="M15 30H49V42H15Z" className="fill-water stroke-transparent" />
      <path d="M14 24V42H50V24M20 10H44" fill="none" className="stroke-ink-soft" />
      <path d={`M15 30H49M32 10V30${ends([32, 10], [32, 30])}`} />
    </>
  ),
  'from-floor': (
    <>
      <path d="M4 44H60M26 10H54V24H26ZM28 24V44M52 24V44" fill="none" className="stroke-ink-soft" />
      <path d={`M14 10V44${ends([14, 10], [14, 44])}`} />
    </>
  ),
  cord: (
    <>
      <path d="M6 20H16V32H6ZM50 18H58V32H50Z" fill="none" className="stroke-ink-soft" />
      <path d={`M16 26C28 6 38 46 50 25${ends([16, 26], [50, 25])}`} fill="none" />
    </>
  ),
}

/** Where a measure is taken, as a small drawing; the words beside it say the same. */
export function MeasureSketch({ shape }: { readonly shape: SketchShape }) {
  return (
    <svg
      width="64"
      height="50"
      viewBox="0 0 64 50"
      strokeWidth="1.5"
      aria-hidden="true"
      className="flex-none stroke-action"
    >
      {shapes[shape]}
    </svg>
  )
}
