import { useEffect, useRef } from 'react'
import { usePageActions } from '../state/context.tsx'

/** Opens a formula file by the browser's picker; a file dropped anywhere on the page does the same. */
export function OpenFile() {
  const picker = useRef<HTMLInputElement>(null)
  const actions = usePageActions()
  useEffect(() => {
    const over = (event: DragEvent) => {
      if (event.dataTransfer?.types.includes('Files')) event.preventDefault()
    }
    const drop = (event: DragEvent) => {
      const file = event.dataTransfer?.files[0]
      if (!file) return
      event.preventDefault()
      void actions.openFile(file)
    }
    window.addEventListener('dragover', over)
    window.addEventListener('drop', drop)
    return () => {
      window.removeEventListener('dragover', over)
      window.removeEventListener('drop', drop)
    }
  }, [actions])
  return (
    <>
      <button type="button" className="plain-button" onClick={() => picker.current?.click()}>
        Open…
      </button>
      <input
        ref={picker}
        type="file"
        accept=".json,application/json"
        aria-label="Formula file"
        className="file-picker"
        tabIndex={-1}
        hidden
        onChange={(event) => {
          const file = event.currentTarget.files?.[0]
          if (file) void actions.openFile(file)
          event.currentTarget.value = ''
        }}
      />
    </>
  )
}
