import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { readDailyRecord, type RecordOptions } from './daily-record.ts'

const flows = (text: string, options?: RecordOptions) => readDailyRecord(text, options).days.map(({ flow }) => flow)
const dates = (text: string, options?: RecordOptions) => readDailyRecord(text, options).days.map(({ date }) => date)
const notes = (text: string, options?: RecordOptions) => readDailyRecord(text, options).notes.join(' ')
const refusals = (text: string, options?: RecordOptions) =>
  readDailyRecord(text, options).problems.filter(({ isRefused }) => isRefused)
const lines = (...rows: string[]) => rows.join('\n')

describe('columns and numbers', () => {
  test.each([
    ['commas', 'date,flow m3/s\n2021-03-01,0.5\n2021-03-02,1.25'],
    ['semicolons and decimal commas', 'date;flow m3/s\n2021-03-01;0,5\n2021-03-02;1,25'],
    ['tabs', 'date\tflow m3/s\n2021-03-01\t0.5\n2021-03-02\t1.25'],
    ['bars at the edges too', '|date|flow m3/s|\n|2021-03-01|0.5|\n|2021-03-02|1.25|'],
    ['runs of spaces', 'date        flow m3/s\n2021-03-01     0.5\n2021-03-02    1.25'],
    ['quoted decimal commas between commas', '"date","flow m3/s"\n"2021-03-01","0,5"\n"2021-03-02","1,25"'],
    ['no names, with empty lines', '\n2021-03-01,0.5\n\n2021-03-02,1.25\n\n'],
    ['comments', '# from the weir\n# m³/s\n2021-03-01;0.5\n# frost\n2021-03-02;1.25'],
    ['a mark at the start and lines of Windows', '\uFEFFdate,m³/s\r\n2021-03-01,0.5\r\n2021-03-02,1.25\r\n'],
    ['times of day', 'date,m3/s\n2021-03-01T09:00:00Z,0.5\n2021-03-02T09:00:00Z,1.25'],
    ['times of day in a column of spaces', '2021-03-01 09:00 0.5\n2021-03-02 09:00 1.25'],
    ['year, month and day in three columns', 'y,m,d,flow\n2021,3,1,0.5\n2021,3,2,1.25'],
    ['months by name', '1-Mar-2021,0.5\n2 March 2021,1.25'],
    ['dates in one piece', '20210301;0.5\n20210302;1.25'],
    ['words above the table', 'Station;Mill weir\nBegun;1987\nDate;Flow, cumecs\n2021-03-01;0.5\n2021-03-02;1.25'],
    ['powers of ten and signs', '2021-03-01,+5e-1\n2021-03-02,1.25E0'],
  ])('%s', (_, text) => {
    const { days, problems } = readDailyRecord(text, { unit: 'm³/s' })
    expect(problems).toEqual([])
    expect(days).toEqual([
      { date: '2021-03-01', flow: 0.5 },
      { date: '2021-03-02', flow: 1.25 },
    ])
  })

  test('flows alone, one in each row', () => {
    expect(readDailyRecord('flow L/s\n12.5\n11\n10.75').days).toEqual([
      { flow: 0.0125 },
      { flow: 0.011 },
      { flow: 0.01075 },
    ])
    expect(flows('12,5\n11\n10,75', { unit: 'L/s' })).toEqual([0.0125, 0.011, 0.01075])
    expect(notes('1.5\n2.5')).toMatch(/no dates/)
  })
  test('thousands are told from decimals where anything tells them', () => {
    expect(flows('2021-03-01;1.234,5\n2021-03-02;987', { unit: 'm³/s' })).toEqual([1234.5, 987])
    expect(flows('2021-03-01\t1,234.5\n2021-03-02\t987', { unit: 'm³/s' })).toEqual([1234.5, 987])
    expect(flows('2021-03-01;1 234,5\n2021-03-02;987', { unit: 'm³/s' })).toEqual([1234.5, 987])
    expect(flows('2021-03-01;1,234\n2021-03-02;12,5', { unit: 'm³/s' })).toEqual([1.234, 12.5])
    expect(flows('2021-03-01;0.125\n2021-03-02;1.234', { unit: 'm³/s' })).toEqual([0.125, 1.234])
  })
  test('a mark that could be either is taken for decimals, said, and can be chosen', () => {
    const text = '2021-03-01;1,234\n2021-03-02;2,345'
    expect(flows(text, { unit: 'm³/s' })).toEqual([1.234, 2.345])
    expect(notes(text)).toMatch(/decimal mark/)
    expect(readDailyRecord(text).reading).toMatchObject({ decimalMark: ',', otherDecimalMark: '.' })
    expect(flows(text, { unit: 'm³/s', decimalMark: '.' })).toEqual([1234, 2345])
  })
  test('commas between columns and in numbers are refused', () => {
    expect(refusals('date,flow\n2021-03-01,3,5\n2021-03-02,3,6')).toMatchObject([{ row: 2, say: /semicolons/ }])
  })

  const gauges =
    'no,station,date,level m,flow m3/s\n1,4711,2021-03-01,0.42,0.5\n2,4711,2021-03-02,0.61,1.25\n3,4711,2021-03-03,0.4,0.45'
  test('the flow is in the column that is named so; another can be chosen', () => {
    expect(flows(gauges)).toEqual([0.5, 1.25, 0.45])
    expect(notes(gauges)).toMatch(/column 5 \(“flow m3\/s”\) was taken/)
    expect(readDailyRecord(gauges).reading).toMatchObject({
      flowColumn: 5,
      flowColumns: [
        { column: 1, name: 'no' },
        { column: 2, name: 'station' },
        { column: 4, name: 'level m' },
        { column: 5, name: 'flow m3/s' },
      ],
    })
    expect(flows(gauges, { flowColumn: 4, unit: 'm³/s' })).toEqual([0.42, 0.61, 0.4])
  })
  test('without names it is the first of readings, not a count nor a station’s number', () => {
    const unnamed = gauges.split('\n').slice(1).join('\n')
    expect(readDailyRecord(unnamed).reading?.flowColumn).toBe(4)
  })
})

describe('units', () => {
  test.each([
    ['flow (L/s)', 'L/s'],
    ['Abfluss [l/s]', 'L/s'],
    ['q_l/sec', 'L/s'],
    ['litres per second', 'L/s'],
    ['flow l s-1', 'L/s'],
    ['Q m3/s', 'm³/s'],
    ['débit (m³/s)', 'm³/s'],
    ['Q m^3 / s', 'm³/s'],
    ['flow m3 s-1', 'm³/s'],
    ['cumecs', 'm³/s'],
    ['discharge, cubic feet per second', 'ft³/s'],
    ['flow_cfs', 'ft³/s'],
    ['Q ft3/s', 'ft³/s'],
  ])('“%s” names %s', (name, unit) => {
    expect(readDailyRecord(`date;${name}\n2021-03-01;10\n2021-03-02;20`).reading).toMatchObject({
      unit,
      unitIsNamed: true,
    })
  })
  test('a cubic foot is 0.028316846592 m³, a litre a thousandth', () => {
    expect(flows('date,cfs\n2021-03-01,100\n2021-03-02,0')).toEqual([2.8316846592, 0])
    expect(flows('date,L/s\n2021-03-01,9.5\n2021-03-02,0')).toEqual([0.0095, 0])
  })
  test('in a comment it counts as well', () => {
    expect(
      readDailyRecord('# 00060 Discharge, cubic feet per second (Mean)\n2021-03-01,1\n2021-03-02,2').reading?.unit,
    ).toBe('ft³/s')
  })
  test('unnamed, m³/s is taken and said; an option is stronger than the file', () => {
    expect(notes('2021-03-01,10\n2021-03-02,20')).toMatch(/No unit is named: m³\/s was taken.*mean of 15\.0/)
    expect(notes('2021-03-01,10\n2021-03-02,20', { unit: 'L/s' })).not.toMatch(/unit/)
    expect(flows('date,m3/s\n2021-03-01,10\n2021-03-02,20', { unit: 'L/s' })).toEqual([0.01, 0.02])
  })
  test.each(['flow ML/d', 'm3/day', 'discharge mm/d', 'MGD'])(
    '%s is none of them: refused until it is said',
    (name) => {
      const text = `date,${name}\n2021-03-01,10\n2021-03-02,20`
      expect(refusals(text)).toMatchObject([{ row: 1, column: 2, cell: name }])
      expect(flows(text, { unit: 'L/s' })).toEqual([0.01, 0.02])
    },
  )
})

describe('dates', () => {
  test.each([
    ['day first by a 13', lines('12/03/2021,1', '13/03/2021,2'), ['2021-03-12', '2021-03-13'], 'd/m/y'],
    ['month first by a 13', lines('03/12/2021,1', '03/13/2021,2'), ['2021-03-12', '2021-03-13'], 'm/d/y'],
    ['day first by what follows', lines('01.03.2021;1', '02.03.2021;2'), ['2021-03-01', '2021-03-02'], 'd/m/y'],
    ['month first by what follows', lines('3/1/2021;1', '3/2/2021;2'), ['2021-03-01', '2021-03-02'], 'm/d/y'],
    ['years of two digits', lines('31-12-99;1', '01-01-00;2'), ['1999-12-31', '2000-01-01'], 'd/m/y'],
    ['year first', lines('2021/3/1;1', '2021/3/2;2'), ['2021-03-01', '2021-03-02'], 'y-m-d'],
  ])('%s', (_, text, days, order) => {
    const { days: read, reading } = readDailyRecord(text)
    expect(read.map(({ date }) => date)).toEqual(days)
    expect(reading?.dateOrder).toBe(order)
    expect(reading).not.toHaveProperty('otherDateOrder')
  })
  test('where nothing decides, day first is taken, said, and the other offered', () => {
    const text = '01/03/2021,1\n02/05/2021,2'
    expect(dates(text)).toEqual(['2021-03-01', '2021-05-02'])
    expect(notes(text)).toMatch(/d\/m\/y or m\/d\/y: d\/m\/y was taken/)
    expect(readDailyRecord(text).reading).toMatchObject({ dateOrder: 'd/m/y', otherDateOrder: 'm/d/y' })
    const other: RecordOptions = { dateOrder: 'm/d/y' }
    expect(dates(text, other)).toEqual(['2021-01-03', '2021-02-05'])
    expect(readDailyRecord(text, other).reading).toMatchObject({ dateOrder: 'm/d/y', otherDateOrder: 'd/m/y' })
  })
  test('a leap day is one only in its year', () => {
    expect(refusals('2020-02-29,1\n2021-02-28,2')).toEqual([])
    expect(refusals('2021-02-28,1\n2021-02-29,2')).toMatchObject([
      { row: 2, column: 1, cell: '2021-02-29', say: /no such day/ },
    ])
  })
  test('a flow without a date is refused; a line of words below is not', () => {
    expect(refusals('2021-03-01,1\n2021-03-02,2\nMean,1.5')).toMatchObject([{ row: 3, column: 1, cell: 'Mean' }])
    expect(flows('2021-03-01,1\n2021-03-02,2\n2021-03-03,3\nread by the miller', { unit: 'm³/s' })).toEqual([1, 2, 3])
  })
  test('out of order: sorted, and said', () => {
    const text = '2021-03-03,3\n2021-03-01,1\n2021-03-02,2'
    expect(flows(text, { unit: 'm³/s' })).toEqual([1, 2, 3])
    expect(notes(text)).toMatch(/sorted/)
    expect(notes('2021-03-01,1\n2021-03-02,2')).not.toMatch(/sorted/)
  })
})

describe('gaps and repeats', () => {
  test('missing days are counted and not made up', () => {
    const text = '2021-03-01,1\n2021-03-02,2\n2021-03-06,6\n2021-03-08,8'
    expect(flows(text, { unit: 'm³/s' })).toEqual([1, 2, 6, 8])
    expect(notes(text)).toMatch(/4 days .* no flow, the longest run 3 days from 2021-03-03/)
  })
  test.each(['ice', '-', 'NA', '', '***', 'n/a', 'about 3'])('“%s” is a gap, with its row and column', (cell) => {
    const text = lines('date;gauge;L/s', '2021-03-01;a;1', `2021-03-02;a;${cell}`, '2021-03-03;a;3', '2021-03-04;a;4')
    const { days, problems, notes } = readDailyRecord(text)
    expect(days.map(({ flow }) => flow)).toEqual([0.001, 0.003, 0.004])
    expect(problems).toMatchObject([{ row: 3, column: 3, cell, isRefused: false }])
    expect(notes.join()).toMatch(/1 day between .* has no flow/)
  })
  test('a row that ends early is a gap', () => {
    expect(readDailyRecord('2021-03-01,1\n2021-03-02\n2021-03-03,3').problems).toMatchObject([{ row: 2, column: 2 }])
  })
  test('a date twice with one flow counts once; with two flows it is refused with both rows', () => {
    const same = '2021-03-01,1\n2021-03-02,2\n2021-03-02,2.0\n2021-03-03,3'
    expect(flows(same, { unit: 'm³/s' })).toEqual([1, 2, 3])
    expect(notes(same)).toMatch(/1 row repeated a date/)
    const clash = '2021-03-01,1\n2021-03-02,2\n2021-03-03,3\n2021-03-02,4'
    expect(refusals(clash)).toMatchObject([{ row: 4, column: 1, say: /row 2 with “2” and here in row 4 with “4”/ }])
    expect(flows(clash)).toEqual([])
  })
  test('readings within the day are no daily record', () => {
    const hours = [0, 1, 2].flatMap((day) =>
      [6, 12, 18].map((hour) => `2021-03-0${day + 1} ${String(hour).padStart(2, '0')}:00,${hour + day}`),
    )
    expect(refusals(hours.join('\n'))).toMatchObject([{ say: /mean of each day/ }])
  })
  test('a negative flow is refused with its row and column', () => {
    const text = '# weir\ndate,L/s\n2021-03-01,1\n2021-03-02,-999\n2021-03-03,−1'
    expect(refusals(text)).toMatchObject([
      { row: 4, column: 2, cell: '-999' },
      { row: 5, column: 2, cell: '−1' },
    ])
    expect(flows(text)).toEqual([])
    expect(flows('2021-03-01,0\n2021-03-02,1', { unit: 'm³/s' })).toEqual([0, 1])
  })
})

describe('no table', () => {
  test.each([
    ['nothing', ''],
    ['blanks', ' \n\n\t\n'],
    ['a letter', 'Dear miller,\nthe stream was low in 1976, about 3 buckets.\nYours'],
    ['a page', '<!doctype html>\n<html><body><p>404</p></body></html>'],
    ['an object', '{"flow": [1, 2, 3], "unit": "L/s"}'],
    ['names only', 'date,flow\n'],
    ['dates only', '2021-03-01\n2021-03-02\n2021-03-03'],
    ['bytes', '\u0000\u0001PNG\u0002\n\u0003\u0004'],
  ])('%s', (_, text) => {
    const { days, problems, reading } = readDailyRecord(text)
    expect(days).toEqual([])
    expect(reading).toBeUndefined()
    expect(problems).toMatchObject([
      { isRefused: true, say: /This is no table of daily flows. Give a row for each day/ },
    ])
  })
  test('a quotation mark that never closes', () => {
    const text = '2021-03-01,1\n2021-03-02,"2\n2021-03-03,3\n2021-03-04,4\n2021-03-05,5\n2021-03-06,6'
    expect(refusals(text)).toMatchObject([{ say: /quotation mark/ }])
  })
  test('whatever the text, it is read or refused with a sentence', () => {
    const cell = fc.oneof(
      fc.constantFrom('2021-03-01', '03/04/2021', '1,5', '2.5', '-1', 'ice', '', '"', 'L/s', '#', '1.234.567'),
      fc.string({ maxLength: 8 }),
    )
    const text = fc
      .array(fc.tuple(cell, fc.constantFrom(',', ';', '\t', ' ', '|', '\n', '\r\n')), { maxLength: 60 })
      .map((pairs) => pairs.flat().join(''))
    fc.assert(
      fc.property(text, (text) => {
        const { days, problems } = readDailyRecord(text)
        for (const { flow } of days) expect(flow >= 0 && Number.isFinite(flow)).toBe(true)
        expect(days.length > 0 || problems.length > 0).toBe(true)
        for (const { row, column, say } of problems)
          expect(row >= 1 && column >= 1 && say.length > 20 && !say.includes('undefined')).toBe(true)
      }),
    )
  })
})

describe('a record written in any way reads back the same', () => {
  const two = (number: number) => String(number).padStart(2, '0')
  const dateWriters: Record<string, (year: number, month: number, day: number) => string> = {
    'y-m-d': (y, m, d) => `${y}-${two(m)}-${two(d)}`,
    'y/m/d': (y, m, d) => `${y}/${m}/${d}`,
    'd/m/y': (y, m, d) => `${d}/${m}/${y}`,
    'd.m.y': (y, m, d) => `${two(d)}.${two(m)}.${y}`,
    'd-m-yy': (y, m, d) => `${two(d)}-${two(m)}-${two(y % 100)}`,
    'm/d/y': (y, m, d) => `${m}/${d}/${y}`,
    ymd: (y, m, d) => `${y}${two(m)}${two(d)}`,
  }
  const inOneUnit = { 'L/s': 1000, 'm³/s': 1, 'ft³/s': 1 / 0.028316846592 } as const
  const written = fc.record({
    first: fc.integer({ min: 0, max: 20_000 }),
    // So many days in a row always hold a 13th.
    flows: fc.array(fc.integer({ min: 0, max: 99_999 }), { minLength: 45, maxLength: 120 }),
    places: fc.integer({ min: 0, max: 4 }),
    left: fc.array(fc.integer({ min: 0, max: 30 }), { maxLength: 8 }),
    order: fc.constantFrom(...Object.keys(dateWriters)),
    time: fc.constantFrom('', ' 09:00', 'T00:00:00Z'),
    delimiter: fc.constantFrom(',', ';', '\t', '|', ' ', '   '),
    comma: fc.boolean(),
    unit: fc.constantFrom('L/s' as const, 'm³/s' as const, 'ft³/s' as const),
    names: fc.boolean(),
    comments: fc.boolean(),
    end: fc.constantFrom('\n', '\r\n'),
    shuffle: fc.array(fc.nat(), { minLength: 120, maxLength: 120 }),
    shuffled: fc.boolean(),
  })
  test('any delimiter, mark, date, unit and order of rows', () => {
    fc.assert(
      fc.property(written, (given) => {
        const isPlain = given.delimiter.trim() === '' && given.delimiter !== '\t'
        const days = given.flows
          .map((flow, i) => ({ day: given.first + i, flow: (flow / 10 ** given.places).toFixed(given.places) }))
          .filter((_, i) => !given.left.includes(i))
        const rows = days.map(({ day, flow }, i) => {
          const date = new Date(day * 86_400_000)
          const text = dateWriters[given.order]!(date.getUTCFullYear(), date.getUTCMonth() + 1, date.getUTCDate())
          const number = given.comma ? flow.replace('.', ',') : flow
          const cell = given.comma && given.delimiter === ',' ? `"${number}"` : number
          const time = given.order === 'ymd' || (isPlain && given.time.startsWith('T')) ? '' : given.time
          return { key: given.shuffled ? given.shuffle[i]! : i, text: `${text}${time}${given.delimiter}${cell}` }
        })
        const body = rows.toSorted((a, b) => a.key - b.key).map(({ text }) => text)
        const text = [
          ...(given.comments ? ['# read at the weir'] : []),
          ...(given.names ? [`date${given.delimiter}flow [${given.unit}]`] : []),
          ...body,
        ].join(given.end)
        const { days: read, problems } = readDailyRecord(text, given.names ? {} : { unit: given.unit })
        expect(problems).toEqual([])
        expect(read.map(({ date }) => date)).toEqual(
          days.map(({ day }) => new Date(day * 86_400_000).toISOString().slice(0, 10)),
        )
        read.forEach(({ flow }, i) => expect(flow * inOneUnit[given.unit]).toBeCloseTo(Number(days[i]!.flow), 6))
      }),
      { numRuns: 200 },
    )
  })
})
