import { useState } from 'react'
import { useLocation, useNavigate } from 'react-router-dom'
import { useIsLive } from '../../lib/use-is-live.ts'

/** Put into the history beside an address that the field itself wrote, so that it is not taken for a new one. */
interface FindState {
  find?: string
}

/** The words looked for, as the address has them (`?find=`); `key` changes when an address comes that the field did not write. */
export function useFindInAddress() {
  const location = useLocation()
  const navigate = useNavigate()
  const isLive = useIsLive()
  const written = (location.state as FindState | null)?.find ?? location.key
  const find = isLive ? (new URLSearchParams(location.search).get('find') ?? '') : ''
  const write = (text: string) => {
    const search = text.trim() === '' ? '' : `?${new URLSearchParams({ find: text.trim() })}`
    void navigate({ search }, { replace: true, preventScrollReset: true, state: { find: written } satisfies FindState })
  }
  return { key: written, find, write }
}

/** What is typed goes ahead of the address, which follows it. */
export function useFindText({ find, write }: { find: string; write: (text: string) => void }) {
  const [typed, setTyped] = useState<string>()
  const change = (text: string) => {
    setTyped(text)
    write(text)
  }
  return [typed ?? find, change] as const
}
