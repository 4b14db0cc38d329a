import type {
  ChoiceQuestion,
  MatchQuestion,
  NumberQuestion,
  OrderQuestion,
  PartsQuestion,
  Question,
} from './question.ts'

export const jetSpeed: NumberQuestion = {
  id: 'jet-speed',
  kind: 'number',
  calculator: 'jet',
  ask: 'jetVelocity',
  draw: {
    netHead: { from: '13 m', to: '83 m', step: '1 m' },
    standing: { of: 'netHead', times: [1.1, 1.25], step: '0.5 m' },
  },
  fixed: { velocityCoefficient: 0.97, jetCount: 1, flow: '6.5 L/s' },
  say: 'At rest {standing}, running {netHead}, and {flow} flows. How fast is the jet?',
  tolerance: { relative: 0.01 },
  figures: 3,
  mistakes: [
    { with: { netHead: 'standing' }, because: 'That is the head at rest, {standing}.' },
    { with: { velocityCoefficient: 1 }, because: 'That leaves the loss of the nozzle out.' },
    { times: 0.5, because: 'That is the speed of the bucket.' },
  ],
}

/** Answered in per cent or as 0–1. */
export const nozzleShare: NumberQuestion = {
  id: 'nozzle-share',
  kind: 'number',
  calculator: 'jet',
  ask: 'nozzleEfficiency',
  marks: 2,
  draw: { velocityCoefficient: { from: 0.94, to: 0.98, step: 0.01 } },
  fixed: { netHead: '33 m', jetCount: 1, flow: '6.5 L/s' },
  say: 'Its velocity coefficient is {velocityCoefficient}. What share of the power does the nozzle pass on?',
  tolerance: { absolute: '0.2 %' },
}

/** Its second part rests on the first, and the third on the second. */
export const headToTurns: PartsQuestion = {
  id: 'head-to-turns',
  kind: 'parts',
  say: 'The net head is {netHead} and the pitch circle {pitchDiameter}.',
  draw: {
    netHead: { from: '21 m', to: '64 m', step: '1 m' },
    pitchDiameter: { from: '180 mm', to: '320 mm', step: '10 mm' },
  },
  parts: [
    {
      id: 'jet',
      calculator: 'jet',
      ask: 'jetVelocity',
      inputs: { netHead: 'netHead', velocityCoefficient: 0.97, jetCount: 1, flow: '6.5 L/s' },
      say: 'How fast is the jet?',
      tolerance: { relative: 0.01 },
      mistakes: [{ times: 0.5, because: 'That is half of it.' }],
    },
    {
      id: 'turns',
      calculator: 'runner',
      ask: 'speed',
      inputs: { jetVelocity: 'jet', speedRatio: 0.46, pitchDiameter: 'pitchDiameter' },
      say: 'How fast does the runner turn?',
      tolerance: { relative: 0.01 },
      mistakes: [{ with: { speedRatio: 0.92 }, because: 'The bucket takes less than half of the jet’s speed.' }],
    },
    {
      id: 'rim',
      calculator: 'runner',
      ask: 'bucketSpeed',
      inputs: { jetVelocity: 'jet', speedRatio: 0.46, speed: 'turns' },
      say: 'How fast is the bucket?',
      tolerance: { relative: 0.01 },
    },
  ],
}

export const whyHalf: ChoiceQuestion = {
  id: 'why-half',
  kind: 'choose-one',
  say: 'Why does a bucket want about half of the speed of the jet?',
  choices: [
    { say: 'There the water leaves with hardly any speed.', right: true },
    { say: 'There the bearings run cool.', because: 'Bearings do not decide it.' },
    { say: 'There the push is hardest.', because: 'The push is hardest on a bucket that stands still.' },
  ],
}

export const whatHurts: ChoiceQuestion = {
  id: 'what-hurts',
  kind: 'choose-several',
  say: 'What can hurt at an open nozzle?',
  choices: [
    { say: 'the jet itself', right: true },
    { say: 'stones in the jet', right: true },
    { say: 'its colour', because: 'Colour hurts nobody.' },
    { say: 'a hand before a shut valve that is drained', because: 'Shut and drained, it holds no water.' },
  ],
}

export const shutDown: OrderQuestion = {
  id: 'shut-down',
  kind: 'order',
  say: 'Put the stopping of a wheel in order.',
  items: ['divert the jet', 'wait for the wheel to stop', 'shut the valve slowly', 'take the load off', 'lock it off'],
  because: 'Water goes first, and slowly.',
}

export const symptoms: MatchQuestion = {
  id: 'symptoms',
  kind: 'match',
  say: 'What does the gauge tell?',
  marks: 3,
  pairs: [
    { left: 'running low, power low', right: 'the pipe loses more', because: 'Both fall when less head arrives.' },
    { left: 'running high, power low', right: 'the nozzle is blocked', because: 'Less flow loses less on the way.' },
    { left: 'the needle trembles', right: 'air in the pipe', because: 'Bubbles give way.' },
    { left: 'a spitting jet', right: 'air in the pipe', because: 'Bubbles come out of the nozzle too.' },
  ],
}

export const everyKind: Question[] = [jetSpeed, nozzleShare, headToTurns, whyHalf, whatHurts, shutDown, symptoms]
