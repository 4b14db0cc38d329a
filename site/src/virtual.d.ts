declare module 'virtual:lesson-index' {
  export const lessonIndex: readonly import('./lib/lesson-index.ts').LessonIndexEntry[]
}
