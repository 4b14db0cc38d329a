import fc from 'fast-check'
import { compile, unit } from 'mathjs'
import { describe, expect, test } from 'vitest'
import { calculate, solve } from '../solve.ts'
import { expectNear } from '../testing/near.ts'
import { outside } from '../testing/outside-check.ts'
import { runs } from '../testing/properties.ts'
import { anyInputs } from '../testing/any-inputs.ts'
import { screen } from './screen.ts'

type Keys = 'grossArea' | 'faceArea' | 'throughVelocity' | 'headLoss'
const found = (inputs: object) => calculate('screen', inputs) as Record<Keys, number>
const usual = {
  flow: 0.0095,
  barSpacing: 0.008,
  barWidth: 0.004,
  approachVelocity: 0.15,
  cloggedFraction: 0.5,
  screenAngle: 60,
  barShapeFactor: 2.42,
}

describe('screen', () => {
  outside('library', 'mathjs 15, the formula of Kirschmer evaluated with units', 'head loss of clean bars', () => {
    const loss = compile('beta * (w / s)^(4/3) * v^2 / (2 * g) * sin(alpha)')
    const scope = {
      beta: 1.79,
      w: unit('9 mm'),
      s: unit('25 mm'),
      v: unit('0.8 m/s'),
      g: unit('9.80665 m/s^2'),
      alpha: unit('75 deg'),
    }
    const head = (loss.evaluate(scope) as { toNumber(unit: string): number }).toNumber('m')
    const given = { barShapeFactor: 1.79, barWidth: 0.009, barSpacing: 0.025, approachVelocity: 0.8, screenAngle: 75 }
    expectNear(found({ ...usual, ...given }).headLoss, head, { relative: 1e-12 })
  })

  outside(
    'derived',
    'continuity: through the gaps that stay clear, bar by bar, runs all of the flow',
    'a screen counted out in bars',
    () => {
      const { grossArea, throughVelocity } = found(usual)
      // One metre deep: so many pitches of gap and bar side by side, half of the gaps clear.
      const gaps = grossArea / (usual.barSpacing + usual.barWidth)
      const clear = gaps * (1 - usual.cloggedFraction) * usual.barSpacing
      expectNear(clear * throughVelocity, usual.flow, { relative: 1e-12 })
    },
  )

  outside(
    'derived',
    'Kirschmer’s law read backwards: its exponent 4/3, its square of the speed and its sine, each from two losses',
    'ratios of losses',
    () => {
      const loss = (change: object) => found({ ...usual, ...change }).headLoss
      expect(Math.log(loss({ barWidth: 0.008 }) / loss({})) / Math.LN2).toBeCloseTo(4 / 3, 12)
      expect(loss({ approachVelocity: 0.3 }) / loss({})).toBeCloseTo(4, 12)
      expect(loss({ screenAngle: 30 }) / loss({ screenAngle: 90 })).toBeCloseTo(0.5, 12)
    },
  )

  outside('memory', 'ESHA guide 2004, ch. 5: bars of β 2.42 and 1.79 for flat and round', 'flat bars take more', () => {
    expect(found(usual).headLoss / found({ ...usual, barShapeFactor: 1.79 }).headLoss).toBeCloseTo(2.42 / 1.79, 12)
  })

  test('an upright clean screen is as large as the stream', () => {
    const { grossArea, faceArea } = found({ ...usual, cloggedFraction: 0, screenAngle: 90 })
    expect(grossArea).toBeCloseTo(usual.flow / usual.approachVelocity, 12)
    expect(faceArea).toBeCloseTo(grossArea, 12)
  })

  test('the face is never smaller than the area, and the water never slower between the bars', () => {
    fc.assert(
      fc.property(anyInputs(screen), (inputs) => {
        const { grossArea, faceArea, throughVelocity } = found(inputs)
        expect(faceArea).toBeGreaterThanOrEqual(grossArea * (1 - 1e-12))
        expect(throughVelocity).toBeGreaterThan(inputs['approachVelocity'] as number)
      }),
      runs,
    )
  })

  test('says that leaves multiply the loss and that the bars must stand full water', () => {
    const { cautions } = solve('screen', usual)
    expect(cautions.map(({ say }) => say).join(' ')).toMatch(/Leaves multiply.*full water on one side/)
  })
})
