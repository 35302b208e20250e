import { usePage } from '../state/context.tsx'
import type { OfflineState } from './keepOffline.ts'

const sentences: Readonly<Record<OfflineState['copy'], string | null>> = {
  none: null,
  coming: 'A copy of this page for use without a network is being kept.',
  kept: 'A copy of this page is kept in this browser: it opens without a network.',
  refused: 'This browser keeps no copy of the page: without a network it will not open.',
}

/** Whether the page will open without a network. */
export function OfflineLine() {
  const sentence = sentences[usePage((state) => state.offline.copy)]
  return sentence === null ? null : <p>{sentence}</p>
}
