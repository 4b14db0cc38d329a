import type { Question } from '#calc/marking/question.ts'
import type { Quantity } from '#calc/index.ts'
import { quantities } from '#calc/units/quantities.ts'
import { LineCounter, parseDocument } from 'yaml'
import { z } from 'zod'

const words = z.string().trim().min(1, 'write some words here')
const id = z
  .string()
  .max(100)
  .regex(/^[a-z][a-z0-9]*(-[a-z0-9]+)*$/, 'use small letters, figures and hyphens, such as jet-speed')
/** A variable's name, or a key of a calculator. */
const key = z.string().regex(/^[a-z][a-zA-Z0-9]*$/, 'use a name such as netHead')
const plainValue = z.union([z.number(), z.string().min(1)], 'write a number, or a quantity as text such as 12 m')
const row = z.record(key, plainValue)
const literal = z.union(
  [plainValue, z.array(plainValue), row, z.array(row)],
  'write a number, a quantity as text such as 12 m, or a list',
)
const marks = z.number().positive().max(20).optional()
const quantity = z.enum(Object.keys(quantities) as [Quantity, ...Quantity[]]).optional()

const drawn = z.union(
  [
    z.strictObject({ from: plainValue, to: plainValue, step: plainValue, quantity }),
    z.strictObject({ of: key, times: z.tuple([z.number(), z.number()]), step: plainValue, quantity }),
  ],
  'write { from, to, step }, or { of: a variable, times: [least, most], step }',
)

const tolerance = z.union(
  [z.strictObject({ relative: z.number().positive().max(0.5) }), z.strictObject({ absolute: plainValue })],
  'write { relative: 0.01 } or { absolute: 0.2 m/s }',
)

const mistake = z
  .strictObject({
    with: z.record(key, literal).optional(),
    times: z.number().optional(),
    output: key.optional(),
    because: words,
  })
  .refine(
    (m) => (m.output === undefined ? m.with !== undefined || m.times !== undefined : !m.with && m.times === undefined),
    'write one of with, times or output (with and times may stand together)',
  )

const asked = {
  say: words,
  calculator: id,
  ask: key,
  inputs: z.record(key, literal).optional(),
  units: z.array(z.string()).min(1).optional(),
  tolerance,
  figures: z.int().min(1).max(6).optional(),
  mistakes: z.array(mistake).optional(),
}

const variables = {
  draw: z.record(key, drawn).optional(),
  fixed: z.record(key, literal).optional(),
}

const choice = z.strictObject({ say: words, right: z.literal(true).optional(), because: words.optional() })

const choices = z
  .array(choice)
  .min(2)
  .max(10)
  .superRefine((list, context) => {
    list.forEach(({ right, because }, i) => {
      if (!right && because === undefined)
        context.addIssue({ code: 'custom', path: [i, 'because'], message: 'say why this choice is wrong' })
    })
  })

const allDiffer = (texts: readonly string[]): boolean => new Set(texts).size === texts.length

const shape = z.discriminatedUnion('kind', [
  z.strictObject({ id, kind: z.literal('number'), marks, ...variables, ...asked }),
  z.strictObject({
    id,
    kind: z.literal('parts'),
    say: words,
    marks,
    ...variables,
    parts: z
      .array(z.strictObject({ id, ...asked }))
      .min(2)
      .max(12),
  }),
  z.strictObject({ id, kind: z.enum(['choose-one', 'choose-several']), say: words, marks, choices }),
  z.strictObject({
    id,
    kind: z.literal('order'),
    say: words,
    marks,
    items: z.array(words).min(3).max(12).refine(allDiffer, 'two items are the same'),
    because: words,
  }),
  z.strictObject({
    id,
    kind: z.literal('match'),
    say: words,
    marks,
    pairs: z
      .array(z.strictObject({ left: words, right: words, because: words }))
      .min(2)
      .max(12)
      .refine((pairs) => allDiffer(pairs.map(({ left }) => left)), 'two pairs have the same left side'),
  }),
])

/** The holes of a text. */
const holes = (text: string): string[] => [...text.matchAll(/\{([^}]*)\}/g)].map(([, name]) => name!)

type Problem = { path: (string | number)[]; message: string }

const variableProblems = (question: Extract<Question, { kind: 'number' | 'parts' }>): Problem[] => {
  const { draw = {}, fixed = {} } = question
  const known = [...Object.keys(draw), ...Object.keys(fixed)]
  const problems: Problem[] = []
  for (const name of Object.keys(draw).filter((name) => Object.hasOwn(fixed, name)))
    problems.push({ path: ['fixed', name], message: `${name} is drawn already` })
  Object.entries(draw).forEach(([name, drawn], i, all) => {
    if ('of' in drawn && !all.slice(0, i).some(([earlier]) => earlier === drawn.of))
      problems.push({ path: ['draw', name, 'of'], message: `no variable called “${drawn.of}” is drawn before it` })
  })
  const texts: Problem[] = [{ path: ['say'], message: question.say }]
  const addMistakes = (mistakes: { because: string }[] | undefined, path: Problem['path']) =>
    mistakes?.forEach(({ because }, i) => texts.push({ path: [...path, 'mistakes', i, 'because'], message: because }))
  if (question.kind === 'number') addMistakes(question.mistakes, [])
  else
    question.parts.forEach((part, i) => {
      texts.push({ path: ['parts', i, 'say'], message: part.say })
      addMistakes(part.mistakes, ['parts', i])
      if (known.includes(part.id) || question.parts.findIndex((other) => other.id === part.id) < i)
        problems.push({ path: ['parts', i, 'id'], message: `“${part.id}” is the name of something else already` })
    })
  for (const { path, message } of texts)
    for (const hole of holes(message))
      if (!known.includes(hole)) problems.push({ path, message: `there is no variable called “${hole}”` })
  return problems
}

const choiceProblems = ({ kind, choices }: Extract<Question, { choices: unknown }>): Problem[] => {
  const right = choices.filter((choice) => choice.right).length
  if (kind === 'choose-one' && right !== 1)
    return [{ path: ['choices'], message: `mark exactly one choice “right: true”; ${right} are marked` }]
  return right === 0 ? [{ path: ['choices'], message: 'mark the right choices “right: true”' }] : []
}

export const questionSchema = shape.superRefine((question, context) => {
  const problems =
    question.kind === 'number' || question.kind === 'parts'
      ? variableProblems(question)
      : 'choices' in question
        ? choiceProblems(question)
        : []
  for (const { path, message } of problems) context.addIssue({ code: 'custom', path, message })
})

export const questionBankSchema = z
  .array(questionSchema)
  .min(1, 'a bank holds at least one question')
  .superRefine((bank, context) => {
    bank.forEach(({ id }, i) => {
      if (bank.findIndex((other) => other.id === id) < i)
        context.addIssue({ code: 'custom', path: [i, 'id'], message: `another question is called “${id}” too` })
    })
  })

/** "question “jet-speed”, mistakes 2, because". */
const place = (path: readonly PropertyKey[], data: unknown): string => {
  const [index, ...rest] = path
  if (typeof index !== 'number') return 'the bank'
  const entry: unknown = Array.isArray(data) ? data[index] : undefined
  const id = typeof entry === 'object' && entry !== null && 'id' in entry ? entry.id : undefined
  const name = typeof id === 'string' ? `question “${id}”` : `question ${index + 1}`
  return rest.reduce<string>(
    (said, step) => (typeof step === 'number' ? `${said} ${step + 1}` : `${said}, ${String(step)}`),
    name,
  )
}

/** Reads a bank. Throws an Error whose lines name the bank, the question, the place in it and what to write instead. */
export const parseQuestionBank = (source: string, name: string): Question[] => {
  const lines = new LineCounter()
  const document = parseDocument(source, { lineCounter: lines })
  if (document.errors.length > 0)
    throw new Error(
      document.errors.map(({ message }) => `${name}: ${message.split('\n')[0]!.replace(/:$/, '')}`).join('\n'),
    )
  const data: unknown = document.toJS()
  const read = questionBankSchema.safeParse(data)
  if (read.success) return read.data
  throw new Error(read.error.issues.map(({ path, message }) => `${name}: ${place(path, data)}: ${message}`).join('\n'))
}
