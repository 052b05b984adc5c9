/** JetBrains Mono and its stand-in advance 0.6 em for every character, so a label's box is known before it is drawn. */
export function monoWidth(text: string, fontPx: number): number {
  return text.length * 0.6 * fontPx
}

/** Cut with an ellipsis where it is longer than so many characters. */
export function shorten(text: string, most: number): string {
  return text.length <= most ? text : `${text.slice(0, Math.max(1, most - 1)).trimEnd()}…`
}

/** The longest of the texts that fits, tried in order; none: undefined. */
export function longestThatFits(texts: readonly string[], widthPx: number, fontPx: number): string | undefined {
  return texts.find((text) => monoWidth(text, fontPx) <= widthPx)
}
