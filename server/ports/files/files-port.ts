/** Where the bytes of photos and documents lie. The keys are ours: they name a shop and a file, never a person. */
export type FilesPort = {
  /** Resolves when the bytes are safe; putting the same key again replaces them. */
  put(key: string, bytes: Uint8Array): Promise<void>;
  /** Resolves when the bytes are gone, or were not there. */
  remove(key: string): Promise<void>;
  /** A stream of the bytes, or null where there are none under this key. */
  read(key: string): Promise<ReadableStream<Uint8Array> | null>;
};
