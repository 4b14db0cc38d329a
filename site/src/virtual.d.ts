declare module 'virtual:lesson-index' {
  export const lessonIndex: readonly import('./lib/lesson-index.ts').LessonIndexEntry[]
}
declare module 'virtual:calculator-index' {
  export const calculatorIndex: readonly import('./lib/calculator-index.ts').CalculatorIndexEntry[]
}
declare module 'virtual:calculator-loaders' {
  export const loaders: Readonly<Record<string, () => Promise<import('../../calc/definition.ts').CalculatorDefinition>>>
}
