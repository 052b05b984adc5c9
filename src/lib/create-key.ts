/** An Idempotency-Key: 128 random bits. `crypto.randomUUID` is there on secure origins only. */
export const createKey = (): string =>
  [...crypto.getRandomValues(new Uint8Array(16))].map((byte) => byte.toString(16).padStart(2, '0')).join('')
