/** The store does not answer, or not as it should. */
export class FileStoreError extends Error {
  override readonly name = 'FileStoreError'
}
