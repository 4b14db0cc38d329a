/** Loads each thing once and keeps its promise, as `use` wants it; what failed is tried again by the next who asks. */
export const loadOnce = <T>(load: (name: string) => Promise<T>) => {
  const promises = new Map<string, Promise<T>>()
  return (name: string): Promise<T> => {
    const known = promises.get(name)
    if (known) return known
    const promise = load(name)
    promises.set(name, promise)
    promise.catch(() => promises.delete(name))
    return promise
  }
}
