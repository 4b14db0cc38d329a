import { Notice } from '../components/Notice.tsx'

export function Component() {
  return (
    <Notice title="Calculators">
      <p>This page is not open yet.</p>
    </Notice>
  )
}
