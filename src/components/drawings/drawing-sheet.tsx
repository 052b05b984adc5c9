import { useId, type ReactNode, type RefObject } from 'react'
import { sidePx, type SheetSize } from './tank-layout'

export interface DrawingSheetProps {
  readonly title: string
  /** The drawing in words. */
  readonly description: string
  readonly widthPx: number
  readonly heightPx: number
  /** How the height follows the width; without it the height is fixed. */
  readonly size?: SheetSize
  /** Spacing of the drafting grid and where a crossing lies; a diagram has axes of its own instead. */
  readonly grid?: { readonly px: number; readonly x: number; readonly y: number; readonly label: string }
  readonly isInteractive: boolean
  readonly frame: RefObject<HTMLDivElement | null>
  /** What areas and lines stand for, in words under the drawing. The description says the same. */
  readonly legend?: ReactNode
  readonly children: ReactNode
}

/** Drafting paper with a grid to scale. */
export function DrawingSheet(props: DrawingSheetProps) {
  const { title, description, widthPx, heightPx, size, grid, isInteractive, frame, legend, children } = props
  const id = useId()
  return (
    <figure className="min-w-0">
      <div ref={frame} className="overflow-hidden border border-rule bg-sheet">
        <p aria-hidden="true" className="px-3 pt-2 text-sm text-ink-soft">
          {title}
        </p>
        <div className="relative">
          {size ? <SheetSizer size={size} /> : <svg aria-hidden="true" width="1" height={heightPx} className="block" />}
          <svg
            role={isInteractive ? 'group' : 'img'}
            aria-label={title}
            aria-describedby={`${id}-words`}
            viewBox={`0 0 ${widthPx} ${heightPx}`}
            className="absolute inset-0 h-full w-full"
          >
            {grid && <Grid id={`${id}-grid`} grid={grid} widthPx={widthPx} heightPx={heightPx} />}
            {children}
          </svg>
        </div>
        {legend && (
          <div aria-hidden="true" className="px-3 pb-3">
            {legend}
          </div>
        )}
      </div>
      <figcaption id={`${id}-words`} className="sr-only">
        {description}
      </figcaption>
    </figure>
  )
}

interface GridProps extends Pick<DrawingSheetProps, 'widthPx' | 'heightPx'> {
  readonly id: string
  readonly grid: NonNullable<DrawingSheetProps['grid']>
}

function Grid({ id, grid, widthPx, heightPx }: GridProps) {
  return (
    <>
      <defs>
        <pattern id={id} width={grid.px} height={grid.px} x={grid.x} y={grid.y} patternUnits="userSpaceOnUse">
          <path d={`M${grid.px} 0H0V${grid.px}`} fill="none" strokeWidth="1" className="stroke-grid" />
        </pattern>
      </defs>
      <rect width={widthPx} height={heightPx} fill={`url(#${id})`} />
      <text
        x={widthPx - 12}
        y={heightPx - 10}
        textAnchor="end"
        fontSize="11"
        aria-hidden="true"
        className="fill-ink-soft"
      >
        {grid.label}
      </text>
    </>
  )
}

/**
 * Holds the height open at every width with attributes alone (inline styles would need a laxer content security policy),
 * so that nothing on the page moves when the drawing is laid out anew for its true width.
 */
function SheetSizer({ size }: { readonly size: SheetSize }) {
  const [leftPx, rightPx] = size.sidesPx ?? [sidePx, sidePx]
  return (
    <div aria-hidden="true">
      <svg width="1" height={size.abovePx} className="block" />
      <div className="flex justify-center">
        <svg width={leftPx} height="1" className="block shrink-0" />
        <svg
          width={size.acrossPx}
          viewBox={`0 0 ${size.acrossPx} ${size.contentPx}`}
          className="block h-auto max-w-full min-w-0 shrink"
        />
        <svg width={(size.betweenPx ?? 0) + rightPx} height="1" className="block shrink-0" />
      </div>
      <svg width="1" height={size.belowPx} className="block" />
    </div>
  )
}
