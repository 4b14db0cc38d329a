import { createHash, randomBytes } from 'node:crypto'

/** 256 random bits need no slow hash: nobody can try them all. Only the hash is stored. */
export function newSecretToken() {
  const token = randomBytes(32).toString('base64url')
  return { token, tokenHash: hashSecretToken(token) }
}

export const hashSecretToken = (token: string) => createHash('sha256').update(token).digest('base64url')
