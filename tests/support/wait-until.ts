/** Asks again until the answer is there; fails with the last one when it takes too long. */
export async function waitUntil<T>(ask: () => Promise<T>, isThere: (answer: T) => boolean, withinMs = 30_000) {
  const deadline = Date.now() + withinMs
  for (;;) {
    const answer = await ask()
    if (isThere(answer)) return answer
    if (Date.now() > deadline) throw new Error(`Waited in vain; at last: ${JSON.stringify(answer)}`)
    await new Promise((resolve) => setTimeout(resolve, 100))
  }
}
