import { useEffect, useRef } from 'react'
import { useOpenAny } from '../transfer/useOpenAny.ts'

/** Opens formula files by the browser's picker; dropped anywhere on the page or pasted they do the same. */
export function OpenFile() {
  const picker = useRef<HTMLInputElement>(null)
  const open = useOpenAny()
  useEffect(() => {
    const over = (event: DragEvent) => {
      if (event.dataTransfer?.types.includes('Files')) event.preventDefault()
    }
    const drop = (event: DragEvent) => {
      const files = [...(event.dataTransfer?.files ?? [])]
      if (files.length === 0) return
      event.preventDefault()
      open.files(files)
    }
    const paste = (event: ClipboardEvent) => {
      const data = event.clipboardData
      if (!data || event.defaultPrevented) return
      const files = [...data.files]
      const isTaken =
        files.length > 0
          ? open.files(files)
          : !isTextField(event.target) && open.text(data.getData('text/plain'))
      if (isTaken) event.preventDefault()
    }
    window.addEventListener('dragover', over)
    window.addEventListener('drop', drop)
    window.addEventListener('paste', paste)
    return () => {
      window.removeEventListener('dragover', over)
      window.removeEventListener('drop', drop)
      window.removeEventListener('paste', paste)
    }
  }, [open])
  return (
    <>
      <button type="button" className="plain-button" onClick={() => picker.current?.click()}>
        Open…
      </button>
      <input
        ref={picker}
        type="file"
        multiple
        accept=".json,application/json"
        aria-label="Formula files"
        className="file-picker"
        tabIndex={-1}
        hidden
        onChange={(event) => {
          open.files([...(event.currentTarget.files ?? [])])
          event.currentTarget.value = ''
        }}
      />
    </>
  )
}

const isTextField = (target: EventTarget | null) =>
  target instanceof HTMLElement && target.matches('input, textarea, select, [contenteditable]')
