import { hash, verify } from '@node-rs/argon2'

/** Argon2id (the library's default) at the least cost of the OWASP Password Storage Cheat Sheet: 19 MiB, two passes, one lane (from memory). */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 }

export const hashPassword = (password: string) => hash(password, cost)

let nobodysHash: Promise<string> | undefined

/** Without an account the same work is done, so that the time taken does not tell whether there is one. */
export async function passwordMatches(password: string, passwordHash: string | undefined): Promise<boolean> {
  nobodysHash ??= hashPassword('no account has this password')
  const matches = await verify(passwordHash ?? (await nobodysHash), password)
  return matches && passwordHash !== undefined
}
