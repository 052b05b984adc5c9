/** A local stand-in for a hosted service. */
export interface FakeServer {
  readonly port: number
  readonly stop: () => Promise<void>
}
