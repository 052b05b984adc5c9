import type { Server } from 'node:http'
import { setTimeout as wait } from 'node:timers/promises'
import type { Lifecycle } from './lifecycle'

export interface DrainTimes {
  /** How long `/ready` says no before the door is shut, so that a load balancer can look elsewhere. */
  readonly noticeMs: number
  /** After this, requests still running are cut off. */
  readonly deadlineMs: number
}

const defaultTimes: DrainTimes = { noticeMs: 300, deadlineMs: 10_000 }

/** Stops taking requests and resolves when those that run are answered, or the deadline has passed. */
export async function drain(server: Server, lifecycle: Lifecycle, times: DrainTimes = defaultTimes): Promise<void> {
  lifecycle.isDraining = true
  await wait(times.noticeMs)
  const closed = new Promise<void>((resolve) => server.close(() => resolve()))
  // close() leaves kept-alive sockets open, and waits for sockets on which nothing was ever asked.
  server.closeIdleConnections()
  const sweep = setInterval(() => server.closeIdleConnections(), 100)
  const deadline = setTimeout(() => server.closeAllConnections(), times.deadlineMs)
  await closed
  clearInterval(sweep)
  clearTimeout(deadline)
}
