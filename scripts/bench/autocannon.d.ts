/** The part that is used here; the package brings no types. */
declare module 'autocannon' {
  import type { EventEmitter } from 'node:events'

  export type SetupRequest = (request: object) => object

  interface Options {
    readonly url: string
    readonly connections: number
    /** Seconds. */
    readonly duration: number
    /** Requests in all, whatever time they take. */
    readonly amount?: number
    /** Seconds. */
    readonly timeout: number
    readonly requests: readonly { readonly setupRequest: SetupRequest }[]
  }

  interface Result {
    readonly non2xx: number
    readonly errors: number
    /** Seconds. */
    readonly duration: number
  }

  interface Run extends EventEmitter {
    on(event: 'response', listener: (client: unknown, status: number, bytes: number, ms: number) => void): this
  }

  export default function autocannon(
    options: Options,
    done: (error: Error | null | undefined, result: Result) => void,
  ): Run
}
