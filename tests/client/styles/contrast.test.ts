// @vitest-environment node
import { readFileSync } from 'node:fs'
import { expect, it } from 'vitest'

const css = readFileSync(new URL('../../../src/styles/tokens.css', import.meta.url), 'utf8')

type Colour = readonly [number, number, number]

function readPairs(): Record<string, { light: Colour; dark: Colour }> {
  const parse = (hex: string): Colour => [1, 3, 5].map((at) => parseInt(hex.slice(at, at + 2), 16)) as unknown as Colour
  const found = css.matchAll(/--([a-z-]+): light-dark\((#[0-9a-f]{6}), (#[0-9a-f]{6})\)/g)
  return Object.fromEntries(
    [...found].map(([, name, light, dark]) => [name, { light: parse(light!), dark: parse(dark!) }]),
  )
}

// WCAG 2.2, "relative luminance" and "contrast ratio".
function luminance(colour: Colour): number {
  const [r, g, b] = colour.map((channel) => {
    const s = channel / 255
    return s <= 0.04045 ? s / 12.92 : ((s + 0.055) / 1.055) ** 2.4
  }) as unknown as Colour
  return 0.2126 * r + 0.7152 * g + 0.0722 * b
}

function contrast(a: Colour, b: Colour): number {
  const [low, high] = [luminance(a), luminance(b)].sort((x, y) => x - y) as [number, number]
  return (high + 0.05) / (low + 0.05)
}

const pairs = readPairs()
const themes = ['light', 'dark'] as const

it('measures contrast as WCAG does', () => {
  // WCAG 2.2 technique G18: black on white is 21:1; #777777 on white falls just short of 4.5:1 (4.48, common knowledge).
  expect(contrast([0, 0, 0], [255, 255, 255])).toBeCloseTo(21, 6)
  expect(contrast([119, 119, 119], [255, 255, 255])).toBeCloseTo(4.48, 2)
})

// WCAG 2.2 success criterion 1.4.3 (AA): 4.5:1 for text.
const texts = ['ink', 'ink-soft', 'action', 'fits', 'changes', 'no', 'unknown']
const grounds = ['paper', 'sheet', 'water']
const textPairs = [
  ...texts.flatMap((text) => grounds.map((ground) => [text, ground] as const)),
  ['ink', 'action-soft'] as const,
  ['action', 'action-soft'] as const,
  ['on-action', 'action'] as const,
  ['paper', 'ink'] as const,
]

for (const theme of themes) {
  it.each(textPairs)(`%s is readable as text on %s in the ${theme} theme`, (text, ground) => {
    expect(contrast(pairs[text]![theme], pairs[ground]![theme])).toBeGreaterThanOrEqual(4.5)
  })
}

// 1.4.11 (AA): 3:1 for what tells controls and drawn lines from their ground.
for (const theme of themes) {
  it.each(['ink-soft', 'ink', 'action'])(`%s is strong enough to outline a control in the ${theme} theme`, (line) => {
    for (const ground of ['paper', 'sheet', 'water', 'action-soft']) {
      expect(contrast(pairs[line]![theme], pairs[ground]![theme])).toBeGreaterThanOrEqual(3)
    }
  })
}
