import { StrictMode } from 'react'
import { prerender } from 'react-dom/static'
import { createStaticHandler, createStaticRouter, StaticRouterProvider } from 'react-router-dom'
import { App } from './App.tsx'
import { createQueryClient } from './lib/query-client.ts'
import { routes } from './router.tsx'

export { publicPaths } from './public-paths.ts'

/** The markup of one page as anyone sees it before the server has answered: titles and texts there, prices still to come. */
export async function render(path: string) {
  const handler = createStaticHandler(routes)
  const context = await handler.query(new Request(new URL(path, 'http://leatwright.test')))
  if (context instanceof Response) throw new Error(`${path} answers with ${context.status}, not with a page.`)
  const failure: unknown = Object.values(context.errors ?? {})[0]
  if (failure) throw new Error(`${path} cannot be rendered.`, { cause: failure })
  const { prelude } = await prerender(
    <StrictMode>
      <App queryClient={createQueryClient()}>
        <StaticRouterProvider
          router={createStaticRouter(handler.dataRoutes, context)}
          context={context}
          hydrate={false}
        />
      </App>
    </StrictMode>,
    // What loads late is waited for, and none of it is put at the end with a script to move it: inline scripts are not allowed.
    { progressiveChunkSize: Infinity },
  )
  return new Response(prelude).text()
}
