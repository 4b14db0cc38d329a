import { createContext } from 'react'

/** Which lesson is being read: its questions need to know. Null where a lesson is only shown, as in a preview. */
export const LessonContext = createContext<{ course: string; lesson: string } | null>(null)
