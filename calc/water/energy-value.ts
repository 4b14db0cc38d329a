import { joulesPerKilowattHour } from '../constants.ts'
import { defineCalculator } from '../definition.ts'
import { discountRate, lifeYears, presentWorthOfYearly, price } from './worth-of-money.ts'

/**
 * What a year's energy is worth, and whether it pays for the plant: yearly value E·c, simple payback, net present value, levelised cost of a
 * kWh. E in J, price per kWh, money in one currency and in today's worth, rate as a share a year; value and cost fall at the end of each of
 * n whole years, the capital at the start, nothing is left at the end. The payback is absent where a year costs as much as it brings.
 * Refused outside the ranges. Sources below.
 */
export const energyValue = defineCalculator({
  id: 'energy-value',
  station: 'load',
  title: 'What the energy is worth',
  summary: 'What a year’s energy brings, when it has paid for the plant, and what each kilowatt-hour costs.',
  hazards: [],
  inputs: {
    energyPerYear: {
      kind: 'scalar',
      symbol: 'E',
      label: 'Energy in a year',
      quantity: 'energy',
      help: 'what is used or sold; what the dump load burns counts only if you need the heat',
      range: [1, 1e18],
      usual: [1e9, 1e13],
      initial: 5.04e10,
    },
    price,
    capitalCost: {
      kind: 'scalar',
      symbol: 'K',
      label: 'Cost of the plant',
      quantity: 'money',
      help: 'all of it: pipe, trench, house, machine, cable, licence, your own days at a wage',
      range: [0, 1e12],
      initial: 18_000,
    },
    yearlyCost: {
      kind: 'scalar',
      symbol: 'k',
      label: 'Cost of a year',
      quantity: 'money',
      help: 'care, spares, rent, insurance, and what is laid by for new bearings',
      range: [0, 1e12],
      initial: 420,
    },
    lifeYears,
    discountRate,
  },
  outputs: {
    yearlyValue: { kind: 'scalar', symbol: 'V', label: 'Value of a year', quantity: 'money' },
    simplePayback: { kind: 'scalar', symbol: 'T', label: 'Simple payback', quantity: 'years', sometimes: true },
    netPresentValue: { kind: 'scalar', symbol: 'W', label: 'Net present value', quantity: 'money' },
    levelisedCost: {
      kind: 'scalar',
      symbol: 'c_l',
      label: 'Levelised cost of a kilowatt-hour',
      quantity: 'pricePerKwh',
      help: 'the price at which the plant just pays',
    },
  },
  solve({ energyPerYear, price, capitalCost, yearlyCost, lifeYears, discountRate }) {
    const kilowattHours = energyPerYear / joulesPerKilowattHour
    const yearlyValue = kilowattHours * price
    const worth = presentWorthOfYearly(discountRate, lifeYears)
    const yearlyGain = yearlyValue - yearlyCost
    const netPresentValue = yearlyGain * worth - capitalCost
    const levelisedCost = (capitalCost / worth + yearlyCost) / kilowattHours
    return yearlyGain > 0
      ? { yearlyValue, simplePayback: capitalCost / yearlyGain, netPresentValue, levelisedCost }
      : { yearlyValue, netPresentValue, levelisedCost }
  },
  working(write, { energyPerYear, lifeYears, discountRate }, { simplePayback }) {
    const kilowattHours = {
      symbol: 'E_{kWh}',
      value: energyPerYear / joulesPerKilowattHour,
      say: 'the kilowatt-hours of a year',
    }
    const joules = { symbol: '3.6 \\cdot 10^6', value: joulesPerKilowattHour, say: 'the joules in a kilowatt-hour' }
    const worth = {
      symbol: 'a',
      value: presentWorthOfYearly(discountRate, lifeYears),
      say: 'the worth of one paid yearly',
    }
    return [
      {
        say: 'A kilowatt-hour is 3.6 million joules.',
        formula: write`\frac{${'energyPerYear'}}{${joules}} = ${{ ...kilowattHours, unit: 'kWh' }}`,
      },
      {
        say: 'Each of them at its price.',
        formula: write`${'yearlyValue'} = ${kilowattHours} \, ${'price'}`,
        gives: 'yearlyValue',
      },
      ...(simplePayback === undefined
        ? [{ say: 'A year costs as much as it brings or more: it never pays back.' }]
        : [
            {
              say: 'So many years’ gains make up the cost, if money cost nothing.',
              formula: write`${'simplePayback'} = \frac{${'capitalCost'}}{${'yearlyValue'} - ${'yearlyCost'}}`,
              gives: 'simplePayback' as const,
            },
          ]),
      discountRate === 0
        ? {
            say: 'Without interest one paid each year is worth as many as there are years.',
            formula: write`${'lifeYears'} = ${worth}`,
          }
        : {
            say: 'Money of later years is worth less today: one paid at the end of each year is worth together',
            formula: write`\frac{1 - (1 + ${'discountRate'})^{-${'lifeYears'}}}{${'discountRate'}} = ${worth}`,
          },
      {
        say: 'What all years gain, in today’s money, less what the plant costs.',
        formula: write`${'netPresentValue'} = (${'yearlyValue'} - ${'yearlyCost'}) \, ${worth} - ${'capitalCost'}`,
        gives: 'netPresentValue',
      },
      {
        say: 'The plant’s cost as a yearly sum, with the year’s own cost, shared among the kilowatt-hours.',
        formula: write`${'levelisedCost'} = \frac{${'capitalCost'} / ${worth} + ${'yearlyCost'}}{${kilowattHours}}`,
        gives: 'levelisedCost',
      },
    ]
  },
  cautions: ({ lifeYears }, { simplePayback, netPresentValue }) => [
    ...(simplePayback === undefined
      ? [
          {
            level: 'check' as const,
            about: ['yearlyCost' as const, 'yearlyValue' as const],
            say: 'A year costs as much as it brings or more: the plant never pays back. Look again at the energy that is really used, and at the yearly cost.',
          },
        ]
      : simplePayback > lifeYears
        ? [
            {
              level: 'check' as const,
              about: ['simplePayback' as const],
              say: 'The payback is longer than the years counted: even without interest it does not pay.',
            },
          ]
        : netPresentValue < 0
          ? [
              {
                level: 'check' as const,
                about: ['netPresentValue' as const],
                say: 'At this rate the plant costs more than it brings: below its levelised cost the energy does not pay for it.',
              },
            ]
          : []),
    {
      level: 'note',
      about: ['energyPerYear', 'price'],
      say: 'Only energy that takes the place of bought energy, or is sold, has this price. Count what is used, from a year that is dry too.',
    },
    {
      level: 'note',
      about: ['discountRate', 'price'],
      say: 'All sums are in today’s money: prices that do not rise go with a rate from which inflation is taken off. A price that changes is not followed.',
    },
  ],
  doesNotCheck: [
    'taxes, grants, a loan’s own terms',
    'parts that wear out before the years counted: lay by for them in the yearly cost',
    'whether the buyer or the tariff lasts as long as the plant',
  ],
  example: {
    say: 'Sorrelthwaite: a larger plant that sells most of what it makes, at a rate without inflation of 4 %.',
    inputs: {
      energyPerYear: 1.26e11,
      price: 0.16,
      capitalCost: 52_000,
      yearlyCost: 1350,
      lifeYears: 30,
      discountRate: 0.04,
    },
  },
  plots: [
    {
      say: 'Money that could earn elsewhere makes the same plant worth less.',
      of: 'netPresentValue',
      against: 'discountRate',
      from: 0,
      to: 3,
    },
    {
      say: 'Each kilowatt-hour more makes all of them cheaper.',
      of: 'levelisedCost',
      against: 'energyPerYear',
      from: 0.3,
      to: 2,
    },
  ],
  sources: [
    {
      author: 'W. Short, D. J. Packey, T. Holt',
      title:
        'A Manual for the Economic Evaluation of Energy Efficiency and Renewable Energy Technologies (NREL/TP-462-5173)',
      year: 1995,
    },
    {
      author: 'E. A. Woodroof, A. Thumann',
      title: 'Energy Project Financing: Resources and Strategies for Success',
      year: 2009,
      where: 'examples 35 and 36',
    },
  ],
})
