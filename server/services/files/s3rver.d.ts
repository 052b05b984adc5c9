declare module '@20minutes/s3rver' {
  import type { Server } from 'node:http'
  import type { AddressInfo } from 'node:net'

  export default class S3rver {
    constructor(options: {
      readonly address: string
      readonly port: number
      readonly directory: string
      readonly silent: boolean
      readonly allowMismatchedSignatures: boolean
      readonly configureBuckets: readonly { readonly name: string }[]
    })
    readonly httpServer: Server
    run(): Promise<AddressInfo>
    close(): Promise<void>
  }
}
