const none: Readonly<Record<string, string>> = {}

/** What is wrong at a path and below it; where nothing is, always the same nothing, so that nothing is drawn anew for it. */
export const errorsUnder = (
  errors: Readonly<Record<string, string>>,
  path: string,
): Readonly<Record<string, string>> => {
  const own = Object.entries(errors).filter(([at]) => at === path || at.startsWith(`${path}.`))
  return own.length === 0 ? none : Object.fromEntries(own)
}
