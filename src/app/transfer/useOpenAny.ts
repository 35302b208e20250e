import { useMemo } from 'react'
import { isTable, readPastedTable } from '../ingredients/pasteLines.ts'
import { goToShelf } from '../shelf/goToShelf.ts'
import { usePageActions, useShelfActions } from '../state/context.tsx'

/** What comes in from outside, by whichever way; each answers whether it was something to take. */
export function useOpenAny() {
  const page = usePageActions()
  const shelf = useShelfActions()
  return useMemo(
    () => ({
      /** One file comes to the desk, several go to the shelf. */
      files(files: readonly File[]): boolean {
        const [first, second] = files
        if (!first) return false
        if (second) {
          void shelf.importFiles(files)
          goToShelf()
        } else void page.openFile(first)
        return true
      },
      /** The text of a formula file, or rows of a spreadsheet. */
      text(text: string): boolean {
        if (text.trimStart().startsWith('{')) page.openPastedText(text)
        else if (isTable(text)) page.addPasted(readPastedTable(text))
        else return false
        return true
      },
    }),
    [page, shelf],
  )
}
