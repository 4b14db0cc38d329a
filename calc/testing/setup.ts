import fc from 'fast-check'

/** A short run draws the same cases every time, so that a red one is red for everybody; the long one looks for new ones. */
if (!process.env.DEEP) fc.configureGlobal({ seed: 19_700_101 })
