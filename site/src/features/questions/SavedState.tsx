import type { DraftState } from './use-drafts.ts'

interface SavedStateProps {
  state: DraftState | undefined
  retry: () => void
}

/** Whether what is written is kept. Quiet while it is; with a way out while it is not. */
export function SavedState({ state, retry }: SavedStateProps) {
  if (typeof state === 'object') {
    return (
      <p className="saved-state saved-not" role="alert">
        Not kept on the server yet; it stands only on this page. {state.failed.message}{' '}
        <button type="button" className="link-button" onClick={retry}>
          Keep it now
        </button>
      </p>
    )
  }
  return (
    <p className="saved-state no-print" aria-live="off">
      {state === 'kept' ? '✓ Kept' : ''}
    </p>
  )
}
