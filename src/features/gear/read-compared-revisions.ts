/** Two states of a piece, the earlier one first; 0 stands for before there was any. */
export interface ComparedRevisions {
  readonly before: number
  readonly after: number
}

const readNumber = (text: string | null): number | null =>
  text !== null && /^\d{1,6}$/.test(text) ? Number(text) : null

/** Which revisions an address sets side by side: by default the newest and the one before it. */
export function readComparedRevisions(params: URLSearchParams, newest: number): ComparedRevisions {
  const exists = (number: number | null): number is number => number !== null && number >= 0 && number <= newest
  const [wanted, other] = [readNumber(params.get('after')), readNumber(params.get('before'))]
  const after = exists(wanted) && wanted > 0 ? wanted : newest
  const before = exists(other) && other !== after ? other : after - 1
  return before < after ? { before, after } : { before: after, after: before }
}
