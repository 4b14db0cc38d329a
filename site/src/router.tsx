import type { RouteObject } from 'react-router-dom'
import { RouteError } from './components/RouteError.tsx'
import { Shell } from './components/Shell.tsx'

/** One file a URL, each loaded when it is wanted. */
export const routes: RouteObject[] = [
  {
    Component: Shell,
    HydrateFallback: () => null,
    ErrorBoundary: () => (
      <Shell>
        <RouteError />
      </Shell>
    ),
    children: [
      {
        // A page that fails still stands between bar and foot.
        ErrorBoundary: RouteError,
        children: [
          { index: true, lazy: () => import('./routes/home.tsx') },
          { path: 'courses/:course', lazy: () => import('./routes/course.tsx') },
          { path: 'courses/:course/:lesson', lazy: () => import('./routes/lesson.tsx') },
          { path: 'calculators', lazy: () => import('./routes/calculators.tsx') },
          { path: 'calculators/:id', lazy: () => import('./routes/calculator.tsx') },
          { path: 'tables', lazy: () => import('./routes/tables.tsx') },
          { path: 'tables/:id', lazy: () => import('./routes/table.tsx') },
          { path: 'sign-in', lazy: () => import('./routes/sign-in.tsx') },
          { path: 'sign-up', lazy: () => import('./routes/sign-up.tsx') },
          { path: 'confirm', lazy: () => import('./routes/confirm.tsx') },
          { path: 'forgotten-password', lazy: () => import('./routes/forgotten-password.tsx') },
          { path: 'reset-password', lazy: () => import('./routes/reset-password.tsx') },
          { path: 'my-learning', lazy: () => import('./routes/my-learning.tsx') },
          { path: '*', lazy: () => import('./routes/not-found.tsx') },
        ],
      },
    ],
  },
]
