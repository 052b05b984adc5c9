/** True where one letter after the first more, fewer, changed, or two neighbours swapped, turns one word into the other. */
export const isNearlyEqual = (a: string, b: string): boolean => {
  if (a[0] !== b[0] || Math.abs(a.length - b.length) > 1) return false
  let head = 0
  while (head < a.length && a[head] === b[head]) head++
  let tail = 0
  const shorter = Math.min(a.length, b.length)
  while (tail < shorter - head && a[a.length - 1 - tail] === b[b.length - 1 - tail]) tail++
  const restA = a.slice(head, a.length - tail)
  const restB = b.slice(head, b.length - tail)
  if (restA.length <= 1 && restB.length <= 1) return true
  return restA.length === 2 && restB.length === 2 && restA[0] === restB[1] && restA[1] === restB[0]
}
