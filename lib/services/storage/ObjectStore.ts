/** Objects by key; keys are made by us and match `[0-9a-f/-]`. */
export interface ObjectStore {
  put(key: string, bytes: Uint8Array, contentType: string): Promise<void>
  /** Throws a Refusal 'unavailable' when the store does not answer, 'integrity' when the object is gone. */
  get(key: string): Promise<Uint8Array>
  remove(key: string): Promise<void>
  list(prefix: string): Promise<string[]>
  isUp(): Promise<boolean>
}
