import type { SchemeInputs } from './scheme.ts'

/** Sorrelthwaite, an invented scheme of medium head with one jet, from the leat to the loads. */
export const sorrelthwaite = {
  flow: { flow: 0.0095, waterTemperature: 10 },
  leat: { bottomWidth: 0.3, sideSlope: 1, bedSlope: 0.003, manningN: 0.025 },
  penstock: {
    grossHead: 48,
    sections: [
      { length: 160, insideDiameter: 0.1102, roughness: 5e-5, totalK: 1.1 },
      { length: 80, insideDiameter: 0.0968, roughness: 5e-5, totalK: 0.6 },
    ],
  },
  profile: {
    profile: [
      { distance: 0, elevation: 47.5 },
      { distance: 120, elevation: 30 },
      { distance: 240, elevation: 0 },
    ],
  },
  surge: { wallThickness: 0.0066, pipeModulus: 1e9, closureTime: 5 },
  pressure: { minimumRequiredStrength: 10e6, sdr: 17, temperature: 15 },
  jet: { velocityCoefficient: 0.97, jetCount: 1 },
  runner: { speedRatio: 0.46, pitchDiameter: 0.21, deflectionAngle: 165, bucketFriction: 0.95 },
  alternator: {
    voltsPerThousandRpm: 190,
    output: 'single-phase',
    efficiency: 0.75,
    controllerMinimum: 180,
    controllerMaximum: 850,
  },
  cable: { system: 'single-phase', voltage: 230, length: 180, crossSection: 16, material: 'copper' },
  load: {
    loads: [
      { power: 600, hoursPerDay: 5 },
      { power: 300, hoursPerDay: 24 },
    ],
  },
} as const satisfies SchemeInputs

/** How well its figures are known: one standard uncertainty of each, SI. */
export const sorrelthwaiteUncertainties = {
  'flow.flow': 2e-4,
  'penstock.grossHead': 0.2,
  'penstock.sections[0].insideDiameter': 5e-4,
  'penstock.sections[1].insideDiameter': 5e-4,
  'penstock.sections[0].roughness': 3e-5,
  'penstock.sections[1].roughness': 3e-5,
  'jet.velocityCoefficient': 0.01,
  'runner.speedRatio': 0.02,
  'runner.deflectionAngle': 2,
  'runner.bucketFriction': 0.03,
  'alternator.efficiency': 0.04,
  'cable.length': 2,
} as const
