import { useId, useState, type KeyboardEvent, type MouseEvent } from 'react'
import type { Mark, Scale } from '#shared/engine/types'
import type { Printer } from '#shared/units/print'
import { verdictWords } from '../../lib/verdicts'
import { MarkPin } from './mark-pin'
import { ZoneBand, ZonePatterns } from './patterns'
import { pickMark, stepMark } from './pick-mark'
import { pinMarks, standingMarks } from './place-marks'
import { ScaleAxis } from './scale-axis'
import { fitDomain, percent, placePercent, placeZone } from './scale-domain'
import { findScaleUnit } from './scale-unit'
import { monoWidth, shorten } from './text-width'
import { useContainerWidth } from './use-container-width'

export interface SharedScaleProps {
  readonly scale: Scale
  readonly marks: readonly Mark[]
  readonly printer: Printer
  /** Brand and model of a slug. */
  readonly nameOf: (slug: string) => string
  readonly selected?: string | null
  /** Called by arrow keys and presses. Without it the scale is a picture. */
  readonly onPick?: (slug: string) => void
  /** Called while the pointer rests on a mark, with null when it leaves. */
  readonly onPoint?: (slug: string | null) => void
  /** Lit beside the selected one, such as an answer under the pointer. */
  readonly pointed?: string | null
}

const axisY = 70
const labelPx = 12

/** One deciding check as a ruler with every candidate standing on it. */
export function SharedScale(props: SharedScaleProps) {
  const { scale, marks, printer, nameOf, selected = null, pointed = null, onPick, onPoint } = props
  const id = useId()
  const [box, widthPx] = useContainerWidth<HTMLDivElement>(720)
  const [hovered, setHovered] = useState<string | null>(null)
  const unit = findScaleUnit(scale.unit)

  const known = standingMarks(marks, scale.key)
  const domain = fitDomain([...known.map((mark) => mark.value), ...scale.limits])
  const pinned = pinMarks(known, domain, widthPx)

  const lit = hovered ?? pointed ?? selected
  const optionId = (slug: string) => `${id}-${slug}`
  const findAt = (event: MouseEvent, from: string | null) => {
    const frame = event.currentTarget.getBoundingClientRect()
    const heads = pinned.map(({ slug, xPx, pinPx }) => ({ slug, xPx, yPx: axisY - pinPx }))
    return pickMark(heads, event.clientX - frame.left, event.clientY - frame.top, from)
  }
  const point = (slug: string | null) => {
    if (slug === hovered) return
    setHovered(slug)
    onPoint?.(slug)
  }
  const pickByKey = (event: KeyboardEvent) => {
    const target = stepMark(
      pinned.map((mark) => mark.slug),
      selected,
      event.key,
    )
    if (target === undefined) return
    event.preventDefault()
    onPick?.(target)
  }

  const unplaced = marks.length - known.length
  const summary = `${scale.label}, ${scale.limitText}: ${known.length} on the scale${unplaced > 0 ? `, ${unplaced} without a value` : ''}`
  const shown = pinned.find((mark) => mark.slug === lit)
  const list = onPick
    ? ({
        role: 'listbox',
        tabIndex: 0,
        'aria-label': summary,
        'aria-activedescendant': pinned.some((mark) => mark.slug === selected) ? optionId(selected ?? '') : undefined,
        onKeyDown: pickByKey,
      } as const)
    : ({ role: 'img', 'aria-label': summary } as const)

  return (
    <section className="grid gap-x-6 md:grid-cols-[11rem_minmax(0,1fr)]">
      <div className="text-sm">
        <h3 className="text-base font-semibold">{scale.label}</h3>
        <p className="text-ink-soft">{scale.limitText}</p>
        {unplaced > 0 && <p className="text-ink-soft">{unplaced} without a value</p>}
      </div>
      <div className="px-5">
        <div ref={box}>
          <svg
            width="100%"
            height={axisY + 24}
            overflow="visible"
            className={onPick ? 'block cursor-pointer touch-manipulation' : 'block'}
            onPointerMove={(event) => event.pointerType === 'mouse' && point(findAt(event, null) ?? null)}
            onPointerLeave={() => point(null)}
            onClick={(event) => {
              const slug = findAt(event, selected)
              if (slug) onPick?.(slug)
            }}
          >
            <ZonePatterns id={id} />
            <rect width="100%" height={axisY + 24} fill="transparent" />
            {scale.zones.map((zone) => {
              const band = placeZone(zone, domain)
              return (
                band && <ZoneBand key={zone.from} id={id} outcome={zone.outcome} {...band} y={axisY - 26} height={26} />
              )
            })}
            <ScaleAxis domain={domain} unit={unit} printer={printer} widthPx={widthPx} y={axisY} />
            {scale.limits.map((limit) => (
              <line
                key={limit}
                x1={percent(placePercent(limit, domain))}
                x2={percent(placePercent(limit, domain))}
                y1={axisY - 34}
                y2={axisY + 7}
                strokeWidth="2.5"
                className="stroke-action"
              />
            ))}
            <g {...list}>
              {pinned.map((mark) => (
                <svg key={mark.slug} x={percent(mark.share)} y={axisY} overflow="visible">
                  <g
                    id={optionId(mark.slug)}
                    {...(onPick && {
                      role: 'option',
                      'aria-selected': mark.slug === selected,
                      'aria-label': `${nameOf(mark.slug)}, ${printer.measure(mark.value, unit)}, ${verdictWords[mark.verdict].toLowerCase()}`,
                    })}
                  >
                    <MarkPin verdict={mark.verdict} heightPx={mark.pinPx} isLit={mark.slug === lit} />
                  </g>
                </svg>
              ))}
            </g>
            {shown && (
              <LitLabel
                name={nameOf(shown.slug)}
                value={printer.measure(shown.value, unit)}
                share={shown.share}
                widthPx={widthPx}
              />
            )}
          </svg>
        </div>
      </div>
    </section>
  )
}

interface LitLabelProps {
  readonly name: string
  readonly value: string
  readonly share: number
  readonly widthPx: number
}

function LitLabel({ name, value, share, widthPx }: LitLabelProps) {
  const most = Math.floor(widthPx / monoWidth('0', labelPx)) - value.length - 3
  const text = `${shorten(name, most)} · ${value}`
  // Kept inside the scale: centred over its mark unless an end is nearer than half its length.
  const half = monoWidth(text, labelPx) / 2
  const x = (share / 100) * widthPx
  const anchor = x < half ? 'start' : x > widthPx - half ? 'end' : 'middle'
  return (
    <text
      x={anchor === 'start' ? 0 : anchor === 'end' ? '100%' : percent(share)}
      y="11"
      textAnchor={anchor}
      fontSize={labelPx}
      fontWeight="700"
      strokeWidth="5"
      paintOrder="stroke"
      aria-hidden="true"
      className="pointer-events-none fill-ink stroke-paper"
    >
      {text}
    </text>
  )
}
