import path from 'node:path'
import type { NextFunction, Request, RequestHandler, Response } from 'express'
import express from 'express'
import { Refusal } from '../common/refusal.ts'

export const immutable = 'public, max-age=31536000, immutable'

/**
 * The built site: its files, its pages that were rendered beforehand, and the shell for every other page. What stands
 * under `/api` and `/lessons` is the application's: a lesson's file goes out only after the check of its controller.
 */
export function siteFiles(siteFolder: string): RequestHandler {
  const files = express.static(siteFolder, {
    redirect: false,
    index: 'index.html',
    setHeaders: (response: Response, file: string) => {
      const isHashed = path.relative(siteFolder, file).startsWith(`assets${path.sep}`)
      response.setHeader('Cache-Control', isHashed ? immutable : 'no-cache')
    },
  })

  return (request: Request, response: Response, next: NextFunction) => {
    const segments = segmentsOf(request.path)
    const isOurs = request.method === 'GET' || request.method === 'HEAD'
    if (!isOurs || !segments || segments[0] === 'api' || segments[0] === 'lessons') {
      next()
      return
    }
    const sendPage = () => {
      const isPage = !path.extname(segments.at(-1) ?? '') && request.accepts('html')
      if (!isPage) {
        const nothing = new Refusal('not-found', 'There is nothing at this address.')
        response.status(nothing.getStatus()).json(nothing.getResponse())
        return
      }
      response.setHeader('Cache-Control', 'no-cache')
      sendFirst(response, [path.join(...segments, 'index.html'), 'shell.html', 'index.html'], siteFolder, next)
    }
    files(request, response, sendPage)
  }
}

/** The path as the file system will see it, in lower case: no spelling of `/lessons/…` may slip past. */
function segmentsOf(requestPath: string): string[] | undefined {
  try {
    const plain = path.posix.normalize(decodeURIComponent(requestPath).replaceAll('\\', '/'))
    return plain.toLowerCase().split('/').filter(Boolean)
  } catch {
    return undefined
  }
}

function sendFirst(response: Response, [first, ...others]: string[], root: string, next: NextFunction) {
  if (!first) {
    next()
    return
  }
  response.sendFile(first, { root, cacheControl: false }, (error?: Error) => {
    if (error && !response.headersSent) sendFirst(response, others, root, next)
  })
}
