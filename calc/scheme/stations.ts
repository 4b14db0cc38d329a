/** The stations of a scheme: the calculators that work each out, and what those before hand them. */
import { g } from '../constants.ts'
import type { CalculatorDefinition, InputValue, OutputValue, PlainRow } from '../definition.ts'
import { alternator } from '../electrical/alternator.ts'
import { cable } from '../electrical/cable.ts'
import { bucket } from '../jet/bucket.ts'
import { jet } from '../jet/jet.ts'
import { runner } from '../jet/runner.ts'
import { openChannel } from '../leat/open-channel.ts'
import { flow } from '../pipe/inputs.ts'
import { penstock } from '../pipe/penstock.ts'
import { pipeProfile } from '../pipe/pipe-profile.ts'
import { pressureClass } from '../pipe/pressure-class.ts'
import { surge } from '../pipe/surge.ts'
import { waterTemperature } from '../water/inputs.ts'
import { loadDay } from '../water/load-day.ts'
import { power } from '../water/power.ts'
import { waterDensity } from '../water/properties.ts'

/** In the order of the water. */
export const stationKeys = [
  'flow',
  'leat',
  'penstock',
  'profile',
  'surge',
  'pressure',
  'jet',
  'runner',
  'alternator',
  'cable',
  'load',
] as const
export type StationKey = (typeof stationKeys)[number]

export type Value = InputValue | OutputValue

/** A value by its station and key, `penstock.netHead`; asking for one that is not there makes the asker wait for it. */
export type Look = (path: string) => Value | undefined

/** `look` asks for what this cannot do without; `glance` only for what may change it. */
interface Handed {
  from: (look: Look, glance: Look) => Value | undefined
  yields?: true
}

export interface Work {
  station: StationKey
  /** The calculator, or what only has inputs to be checked. */
  definition: Pick<CalculatorDefinition, 'title' | 'inputs'> & Partial<Pick<CalculatorDefinition, 'solve'>>
  /** What is handed on, by input; the station's own figure goes before it where it `yields`, and must not differ otherwise. */
  handed: Readonly<Record<string, Handed>>
  /** The station's keys that are for another calculator's work. */
  leaves?: readonly string[]
  /** What else is known once it is worked out, under the station's name. */
  adds?: (look: Look) => Readonly<Record<string, number | undefined>>
}

const number = (value: Value | undefined): number | undefined => (typeof value === 'number' ? value : undefined)
const rows = (value: Value | undefined): readonly PlainRow[] => (Array.isArray(value) ? (value as PlainRow[]) : [])
const product = (...values: readonly (Value | undefined)[]): number | undefined =>
  values.every((value) => typeof value === 'number') ? values.reduce((all, value) => all * value, 1) : undefined

const same = (path: string) => ({ from: (look: Look) => look(path) })

/** At the lowest point: by the profile, where there is one. */
const staticPressure: Handed = {
  from: (look, glance) => glance('profile.staticPressure') ?? look('penstock.staticPressure'),
}

/** The section in which the water runs fastest: there a sudden stop is worst. */
const fastest = (look: Look, key: 'velocity' | 'insideDiameter'): number | undefined => {
  const found = rows(look('penstock.found'))
  const given = rows(look('penstock.sections'))
  const velocities = found.map((section) => Number(section['velocity']))
  const place = velocities.indexOf(Math.max(...velocities))
  return number((key === 'velocity' ? found : given)[place]?.[key])
}

/** A nozzle of known size decides the flow; the penstock and the jet then share one equation. */
const nozzles = (look: Look): Value | undefined => {
  const [diameter, count, velocityCoefficient, contraction] = [
    look('jet.nozzleDiameter'),
    look('jet.jetCount'),
    look('jet.velocityCoefficient'),
    look('jet.contractionCoefficient') ?? 1,
  ].map(number)
  return diameter === undefined || count === undefined || velocityCoefficient === undefined
    ? undefined
    : { count, diameter, dischargeCoefficient: velocityCoefficient * contraction! }
}
const hasNozzles = (look: Look) => look('penstock.nozzles') !== undefined || look('jet.nozzleDiameter') !== undefined

export const works: readonly Work[] = [
  {
    station: 'flow',
    definition: { title: 'Flow', inputs: { flow: { ...flow, optional: true }, waterTemperature } },
    handed: {},
  },
  {
    station: 'penstock',
    definition: penstock,
    handed: {
      flow: { from: (look, glance) => (hasNozzles(glance) ? undefined : look('flow.flow')) },
      nozzles: { from: (_, glance) => nozzles(glance) },
      waterTemperature: same('flow.waterTemperature'),
    },
    adds: (look) => ({
      staticPressure: product(waterDensity(number(look('penstock.waterTemperature'))!), g, look('penstock.grossHead')),
      length: rows(look('penstock.sections')).reduce((sum, { length }) => sum + Number(length), 0),
      velocity: fastest(look, 'velocity'),
      insideDiameter: fastest(look, 'insideDiameter'),
      grossPower: product(
        waterDensity(number(look('penstock.waterTemperature'))!),
        g,
        look('penstock.flow'),
        look('penstock.grossHead'),
      ),
    }),
  },
  {
    station: 'leat',
    definition: openChannel,
    handed: { flow: same('penstock.flow') },
  },
  {
    station: 'profile',
    definition: pipeProfile,
    handed: {
      sections: same('penstock.sections'),
      flow: same('penstock.flow'),
      intakeLevel: { ...same('penstock.grossHead'), yields: true },
      waterTemperature: same('flow.waterTemperature'),
    },
    adds: (look) => ({
      staticPressure: product(
        waterDensity(number(look('penstock.waterTemperature'))!),
        g,
        Math.max(...rows(look('profile.points')).map(({ staticHead }) => Number(staticHead))),
      ),
    }),
  },
  {
    station: 'surge',
    definition: surge,
    handed: {
      length: same('penstock.length'),
      insideDiameter: same('penstock.insideDiameter'),
      velocityChange: same('penstock.velocity'),
      staticPressure,
      waterTemperature: same('flow.waterTemperature'),
    },
  },
  {
    station: 'pressure',
    definition: pressureClass,
    handed: {
      workingPressure: staticPressure,
      surgePressure: same('surge.surgePressure'),
    },
  },
  {
    station: 'jet',
    definition: jet,
    handed: {
      netHead: same('penstock.netHead'),
      flow: same('penstock.flow'),
      waterTemperature: same('flow.waterTemperature'),
    },
    leaves: ['nozzleDiameter'],
  },
  {
    station: 'runner',
    definition: bucket,
    handed: {
      speedRatio: same('runner.speedRatio'),
      flow: same('penstock.flow'),
      jetVelocity: same('jet.jetVelocity'),
      waterTemperature: same('flow.waterTemperature'),
    },
    adds: (look) => ({ shaftPower: product(look('jet.jetPower'), look('runner.efficiency')) }),
  },
  {
    station: 'runner',
    definition: runner,
    handed: {
      netHead: same('penstock.netHead'),
      velocityCoefficient: same('jet.velocityCoefficient'),
      jetDiameter: same('jet.jetDiameter'),
      powerPerJet: {
        from: (_, glance) => {
          const [shaft, count] = [number(glance('runner.shaftPower')), number(glance('jet.jetCount'))]
          return shaft === undefined || count === undefined ? undefined : shaft / count
        },
      },
    },
    adds: (look) => {
      const [runaway, speed] = [number(look('runner.runawaySpeed')), number(look('runner.speed'))]
      return { runawayRatio: runaway! / speed! }
    },
  },
  {
    station: 'alternator',
    definition: {
      ...alternator,
      inputs: {
        ...alternator.inputs,
        efficiency: { ...power.inputs.efficiency, label: 'Efficiency of alternator and drive', optional: true },
      },
    },
    handed: {
      speed: same('runner.speed'),
      runawayRatio: same('runner.runawayRatio'),
    },
    adds: (look) => ({ outputPower: product(look('runner.shaftPower'), look('alternator.efficiency')) }),
  },
  {
    station: 'cable',
    definition: cable,
    handed: { power: same('alternator.outputPower') },
    adds: (look) => {
      const [sent, lost] = [number(look('cable.power')), number(look('cable.powerLoss'))]
      return { outputPower: sent! - lost! }
    },
  },
  {
    station: 'load',
    definition: loadDay,
    handed: {
      generatorPower: {
        from: (look, glance) => glance('cable.outputPower') ?? look('alternator.outputPower'),
      },
    },
  },
]
