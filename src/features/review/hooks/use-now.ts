import { useEffect, useState } from 'react'

const secondMs = 1000

/** The time, second by second. Begins with a moment that server and browser agree on, so that both write the same. */
export function useNow(agreed: number): number {
  const [now, setNow] = useState(agreed)
  useEffect(() => {
    const timer = setInterval(() => setNow(Date.now()), secondMs)
    return () => clearInterval(timer)
  }, [])
  return now
}
