import { download, fileName } from '../menu/files.ts'
import { printRefusal } from '../state/printing.ts'
import { currentEvaluation, type PageStore } from '../state/store.ts'

/** Beyond this many characters some programs of mail cut a link. */
const longForMail = 2000

/** Ways out of the page other than paper and the formula file; loaded when they are asked for. */
export function outActions(store: PageStore) {
  return {
    async copyLink(): Promise<{ readonly link: string; readonly isCopied: boolean }> {
      const { formula, drafts } = store.getState()
      const { writeLink } = await import('./formulaLink.ts')
      const link = `${location.href.split('#')[0]}${await writeLink(formula)}`
      const unread = Object.keys(drafts).length > 0 ? ' Fields that could not be read are not in it.' : ''
      const long =
        link.length > longForMail ? ' Some mail programs cut a link this long; a file is safer.' : ''
      try {
        await navigator.clipboard.writeText(link)
      } catch {
        return { link, isCopied: false }
      }
      store.setState({ notice: `The link is copied, ${link.length} characters.${long}${unread}` })
      return { link, isCopied: true }
    },
    async saveCsv(): Promise<void> {
      const state = store.getState()
      const evaluation = currentEvaluation(state)
      const { csvOf } = await import('./csv.ts')
      const text = evaluation && csvOf(evaluation, state.library)
      if (text) download(fileName(state.formula.title, 'csv'), 'text/csv;charset=utf-8', text)
      else
        store.setState({
          notice: `No table was written. ${printRefusal(state) ?? 'There are no figures now.'}`,
        })
    },
  }
}

export type OutActions = ReturnType<typeof outActions>
