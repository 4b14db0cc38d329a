import { StrictMode } from 'react'
import { createRoot, hydrateRoot } from 'react-dom/client'
import { createBrowserRouter } from 'react-router-dom'
import { RouterProvider } from 'react-router-dom'
import { App } from './App.tsx'
import { createQueryClient } from './lib/query-client.ts'
import { routes } from './router.tsx'

const router = createBrowserRouter(routes)

/** A page rendered at build stays as it is until its lazy route is here; then React finds in it what it would draw itself. */
const routeIsLoaded = () =>
  new Promise<void>((resolve) => {
    if (router.state.initialized) return resolve()
    const stop = router.subscribe(({ initialized }) => {
      if (!initialized) return
      stop()
      resolve()
    })
  })

await routeIsLoaded()
const root = document.getElementById('root')!
const app = (
  <StrictMode>
    <App queryClient={createQueryClient()}>
      <RouterProvider router={router} />
    </App>
  </StrictMode>
)
if (root.hasChildNodes()) hydrateRoot(root, app)
else createRoot(root).render(app)
