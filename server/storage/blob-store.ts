/** Contents kept under the SHA-256 of their bytes: the same bytes are one blob, and a blob never changes. */
export interface BlobStore {
  /** Keeps the bytes; gives their hash (64 hex digits). Keeping them again does nothing. */
  put(bytes: Uint8Array): Promise<string>;
  /** The bytes, or null when there are none under that hash. Throws when what is kept does not match its hash. */
  get(hash: string): Promise<Buffer | null>;
}
