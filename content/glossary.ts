/** What the words of the trade mean, for the pop-up beside a word in a lesson. Each in a sentence or two, without other trade words where it can be. */
export const glossary = {
  head: 'Height of water, in metres: how far it falls, or how high it would stand in an open pipe at that place. Ten metres of head press with a little under one bar.',
  'gross head':
    'The whole fall: the height from the water level at the intake or forebay down to the jet, with nothing taken off.',
  'net head':
    'What is left of the gross head at the nozzle once the pipe, its bends and its valves have taken their part. The jet is made from this.',
  penstock: 'The pipe that brings the water down, under pressure, from the forebay to the turbine.',
  leat: 'A small cut channel that leads water along the hillside with hardly any fall.',
  forebay:
    'A small tank at the head of the pipe. It lets grit settle, holds the screen, and keeps the pipe’s mouth under water so that it takes no air.',
  screen: 'Bars, mesh or a perforated plate in front of the pipe that keep out leaves, stones and fish.',
  nozzle: 'The taper at the end of the pipe that turns pressure into a fast, solid stream of water.',
  jet: 'The stream of water through open air from the nozzle to the runner.',
  runner: 'The wheel that the water turns.',
  bucket: 'One of the cups around a runner that turn the jet back almost the way it came.',
  'pitch circle diameter':
    'The diameter of the circle, around the shaft, that the middle of the jet just touches. Runner speed is reckoned on it, not on the outside of the wheel.',
  'runaway speed':
    'The speed a runner reaches with the water full on and nothing holding it back: getting on for twice its working speed.',
  'hydraulic grade line':
    'The line through the heights at which water would stand in open tubes along the pipe. It falls where the pipe takes head.',
  'static pressure': 'What the gauge shows with the valve shut and the water in the pipe at rest.',
  'running pressure':
    'What the gauge shows while the water runs. It is lower than the static pressure by what the pipe takes.',
  'residual flow': 'The water that must stay in the stream at all times, past the intake. It goes first.',
  tailrace: 'The channel that carries the spent water from under the runner back to the stream.',
  needle: 'A pointed rod in the nozzle that is moved along to make the jet thinner or thicker without spoiling it.',
  'long section':
    'A drawing of the scheme cut along the line of the pipe: the ground, the pipe in it, and the heights of the water.',
} as const satisfies Record<string, string>

export type Term = keyof typeof glossary
