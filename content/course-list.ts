/** The five courses in the order of the water, and their lessons in order. A lesson's title, minutes and hazards stand in its own file. */
export interface CourseEntry {
  slug: string
  title: string
  summary: string
  /** Where the course stands on the long section. */
  station: string
  /** What the seed writes; after that the database rules. Minor units. */
  firstPrice: { amount: number; currency: string }
  /** File name without its number; also the lesson's address. A lesson whose file is not there yet shows as not yet open, under this title. */
  lessons: readonly { slug: string; title: string }[]
}

const pounds = (amount: number) => ({ amount: amount * 100, currency: 'GBP' })

export const courseList: readonly CourseEntry[] = [
  {
    slug: 'reading-the-stream',
    title: 'Reading the stream',
    summary: 'Head, flow, a year of water, and staying alive.',
    station: 'stream',
    firstPrice: pounds(0),
    lessons: [
      { slug: 'power', title: 'What a fall of water is worth' },
      { slug: 'head-by-levels', title: 'Measuring head with level and staff' },
      { slug: 'head-by-gauge', title: 'Measuring head with a gauge and hose' },
      { slug: 'flow-by-bucket', title: 'Bucket, stopwatch and honest uncertainty' },
      { slug: 'weirs', title: 'Weirs: the notch in the board' },
      { slug: 'floats-and-salt', title: 'Floats and salt: bigger streams' },
      { slug: 'year-of-water', title: 'A year of water' },
      { slug: 'staying-alive', title: 'Staying alive in and around water' },
    ],
  },
  {
    slug: 'leat-intake-and-pipe',
    title: 'Leat, intake and pipe',
    summary: 'Friction, bends, surge, and will it burst.',
    station: 'pipe',
    firstPrice: pounds(38),
    lessons: [
      { slug: 'intakes-and-screens', title: 'Intakes and screens' },
      { slug: 'leats-and-channels', title: 'Leats and channels' },
      { slug: 'forebay', title: 'Forebay and keeping air out' },
      { slug: 'friction', title: 'Friction: where the head goes' },
      { slug: 'bends-valves-tapers', title: 'Bends, valves, tapers, and the swept bend' },
      { slug: 'sections-in-series', title: 'From main pipe to the turbine: sections in series' },
      { slug: 'choosing-the-pipe', title: 'Choosing the pipe' },
      { slug: 'will-it-burst', title: 'Will it burst?' },
      { slug: 'surge', title: 'Surge: closing a valve' },
      { slug: 'holding-it-down', title: 'Holding it down: thrust, anchors, burying' },
      { slug: 'joints-and-bends', title: 'Joints, threads, heat and hand-formed bends' },
    ],
  },
  {
    slug: 'jet-and-runner',
    title: 'Jet and runner',
    summary: 'Nozzle, bucket, pitch circle, runaway.',
    station: 'runner',
    firstPrice: pounds(32),
    lessons: [
      { slug: 'the-jet', title: 'The jet' },
      { slug: 'needles-and-nozzles', title: 'Needles and nozzles' },
      { slug: 'half-the-jet', title: 'Why a bucket wants half the jet’s speed' },
      { slug: 'runner-speed', title: 'Runner speed and pitch circle diameter' },
      { slug: 'lining-up', title: 'Lining up' },
      { slug: 'which-runner', title: 'Which runner for which site' },
      { slug: 'runaway', title: 'Runaway: the speed nobody wants' },
    ],
  },
  {
    slug: 'alternator-cable-and-load',
    title: 'Alternator, cable and load',
    summary: 'Volts from rev/min, and getting it home.',
    station: 'cable',
    firstPrice: pounds(32),
    lessons: [
      { slug: 'volts-from-speed', title: 'Volts from rev/min' },
      { slug: 'belts-and-couplings', title: 'Belts and couplings' },
      { slug: 'cable-loss', title: 'Getting it home: cable loss' },
      { slug: 'dump-loads', title: 'Somewhere for the power to go' },
      { slug: 'open-circuit', title: 'Open circuit, runaway and the controller’s limit' },
      { slug: 'conduit-and-earthing', title: 'Conduit, glands, earthing' },
    ],
  },
  {
    slug: 'commission-and-keep',
    title: 'Commission and keep',
    summary: 'What the gauge says. The sheet on the wall.',
    station: 'valve',
    firstPrice: pounds(28),
    lessons: [
      { slug: 'choosing-a-gauge', title: 'Choosing and fitting a pressure gauge' },
      { slug: 'static-and-running', title: 'Static and running: what the gauge tells' },
      { slug: 'first-day-of-water', title: 'The first day of water' },
      { slug: 'measured-against-predicted', title: 'Measured against predicted' },
      { slug: 'is-it-worth-it', title: 'Is it worth it?' },
      { slug: 'keeping-it-running', title: 'Keeping it running: the year’s round' },
      { slug: 'handing-over', title: 'Handing over' },
    ],
  },
]
