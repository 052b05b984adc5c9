export interface Token {
  readonly type: 'word' | 'number' | 'sign' | 'stop'
  /** Lower case, one spelling. */
  readonly text: string
  readonly start: number
  readonly end: number
  /** Nothing stands between it and the token before. */
  readonly glued: boolean
  /** Of a number; undefined where it cannot be read. */
  readonly value?: number
  /** Of "1,200": the value if its commas group thousands. */
  readonly grouped?: number
  /** A minus stands before it: "-5", but not "8-10". */
  readonly isNegative?: true
  /** Written as a word: "twenty". */
  readonly spelled?: true
}
