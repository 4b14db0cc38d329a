const storageKey = 'return-path'

/** A path of this site only: `//other.example` and `/\other.example` would lead away from it. */
export const safePath = (path: string | null) => (path && /^\/(?![/\\])/.test(path) ? path : undefined)

export const withReturnPath = (page: string, path: string | undefined) =>
  path ? `${page}?${new URLSearchParams({ next: path }).toString()}` : page

/** Kept over the way through the mailbox, which ends in a new page. */
export const keepReturnPath = (path: string) => localStorage.setItem(storageKey, path)

export const keptReturnPath = () => safePath(localStorage.getItem(storageKey))

export const dropReturnPath = () => localStorage.removeItem(storageKey)
