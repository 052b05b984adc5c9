export interface PlacedMark {
  readonly slug: string
  readonly xPx: number
  readonly yPx: number
}

const reachPx = 16
/** Heads this close hide each other. */
const samePx = 3

/** The mark under the pointer. A second press on a pile picks the next of the pile, so nothing stays hidden. */
export function pickMark(
  marks: readonly PlacedMark[],
  xPx: number,
  yPx: number,
  selected: string | null,
): string | undefined {
  const distance = (mark: PlacedMark) => Math.hypot(mark.xPx - xPx, (mark.yPx - yPx) / 2)
  const near = marks.filter((mark) => distance(mark) <= reachPx).sort((a, b) => distance(a) - distance(b))
  const nearest = near[0]
  if (!nearest) return undefined
  const pile = marks.filter((mark) => Math.hypot(mark.xPx - nearest.xPx, mark.yPx - nearest.yPx) <= samePx)
  const at = pile.findIndex((mark) => mark.slug === selected)
  return (at < 0 ? nearest : pile[(at + 1) % pile.length])?.slug
}

/** The mark that an arrow key, Home or End leads to from the selected one, lowest value first; other keys: none. */
export function stepMark(slugs: readonly string[], selected: string | null, key: string): string | undefined {
  const at = selected === null ? -1 : slugs.indexOf(selected)
  const last = slugs.length - 1
  const next = Math.min(last, at + 1)
  const previous = at < 0 ? last : Math.max(0, at - 1)
  const targets: Readonly<Record<string, number>> = {
    ArrowRight: next,
    ArrowDown: next,
    ArrowLeft: previous,
    ArrowUp: previous,
    Home: 0,
    End: last,
  }
  return slugs[targets[key] ?? -1]
}
